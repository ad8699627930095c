// Texts of the page of parts: the check before cutting, and every part with both faces.

export const page = {
  title: 'Parts of revision {number}',
  link: 'Parts',
  lead: 'Every part as it is cut, frozen when the revision was released. The plan is what you cut from: these pictures are not to one scale.',
} as const;

export const checks = {
  title: 'Before you cut',
  earlier: 'Worked out by an earlier engine ({engine}): the check before cutting is not part of this revision.',
  nothing: 'No rule had anything to check on this airframe.',
  clear: 'Nothing stands in the way.',
  bad: '{count} bad',
  watch: '{count} to watch',
  note: '{count} for you to judge',
  noteWord: 'judge it yourself',
  waivedCount: '{count} let pass',
  passed: '{count} checks passed',
  passedOne: '1 check passed',
  measured: 'measured',
  least: 'at least',
  most: 'at most',
  fix: 'What to do',
  place: 'Where',
  placeOf: 'Parts of {element}',
  source: 'Source',
  waived: 'Let pass: {reason}',
  pinned: 'Plan view, nose to the left: {element} marked',
} as const;

export const parts = {
  title: 'Parts',
  count: '{count} parts in {drawn} drawings',
  jump: 'Parts by what they belong to',
  other: 'Other parts',
  filter: 'Show parts cut from',
  all: 'everything',
  sheet: '{material}, {thickness} mm',
  key: 'Lines in the pictures',
  one: '1',
  pair: '{count}, mirrored',
  pairOf: 'Drawn: {name}. Mirrored: {other}.',
  counted: 'Count',
  size: 'Size',
  cutFrom: 'Cut from',
  mass: 'Mass of one',
  massMissing: 'not worked out',
  grain: 'Grain',
  where: 'Where it goes',
  whereDrawn: 'Plan view, nose to the left: where {part} goes',
  back: '{face}, turned over like a page',
  picture: '{part}: {face}',
  nothing: 'Nothing is done on this face.',
} as const;

export const faces = {
  upper: 'Upper face',
  lower: 'Lower face',
  inner: 'Inner face',
  outer: 'Outer face',
} as const;

export const grain = {
  any: 'any way',
  level: 'left to right in the picture',
  upright: 'up and down in the picture',
  rising: '{angle}° from level, rising to the right',
  falling: '{angle}° from level, falling to the right',
} as const;

/** What is done along a line, as the builder reads it beside the picture. */
export const operations = {
  counted: '{count} × {what}',
  noted: '{what} · {note}',
  kinds: {
    cut: 'cut through',
    cutToPaper: 'cut to the far paper',
    crease: 'crease',
    bevel: 'bevel',
    paperOff: 'paper off',
    foamOut: 'foam out',
    glue: 'glue',
    tape: 'tape',
    reference: 'place line',
    register: 'pin through to the other face',
  },
  opening: 'opening, cut through',
  bevelAngle: 'bevel {angle}°',
  foldUp: 'fold {angle}° towards you',
  foldDown: 'fold {angle}° away from you',
  wide: '{width} mm wide',
  deep: '{depth} mm deep',
  through: 'to the far paper',
} as const;

/** Short, at the act. */
export const cautions = {
  title: 'Mind',
  knife: { act: 'Knife', words: 'cut away from the hand; a new blade for each sheet.' },
  hotWire: { act: 'Hot wire', words: 'it burns and fumes: air the room, and never on vinyl foam.' },
  laser: { act: 'Laser', words: 'never leave it with polystyrene, never cut vinyl foam.' },
  glue: {
    act: 'Glue',
    words: 'hot glue burns; solvents, sprays and resins can dissolve foam: try a scrap first.',
  },
  carbon: { act: 'Carbon', words: 'dust and splinters: wear a mask, sand it wet.' },
} as const;
