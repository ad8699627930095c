// Names of the lines of the mass list.

export const texts = {
  covering: '{covering} on {element}',
  glue: 'Glue on {part}',
  glueTube: 'Glue along {tube}',
  glueFoot: 'Glue under {element}',
  glueBoom: 'Glue along booms in {part}',
  glueShare: 'Glue, as a share of the foam',
  tape: 'Tape on {part}',
  motor: '{drive}, motor',
  propeller: '{drive}, propeller',
  side: '{name}, {side}',
  undrawn: '{element}, panel {panel}: by area, for its parts are not drawn yet',
  stbd: 'starboard',
  port: 'port',
} as const;
