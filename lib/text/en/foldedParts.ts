// What is written on the parts of a folded wing, and what its development says to a person.

const names = {
  skin: '{surface}, folded skin',
  upper: '{surface}, upper skin',
  lower: '{surface}, lower skin',
  web: '{surface}, spar web',
  rearWeb: '{surface}, rear web',
  panel: '{surface} {panel}',
  onSide: '{part}, {side}',
};

const notes = {
  fold: 'fold {angle} degrees, inner faces together: cut the foam to the outer paper, groove both sides',
  foldPlain: 'fold {angle} degrees, inner faces together: tape the outer face first, groove both sides to a thin skin',
  open: 'fold {angle} degrees, outer faces together: the cut opens, fill it with glue',
  nose: 'leading edge: fold {angle} degrees, inner faces together',
  noseBevel: 'sand the foam down to the fold over {width} mm on both sides with a long block: too flat for a blade',
  noseEdge: 'leading edge: sand the foam away over {width} mm down to the outer face',
  bevelRunsOut: 'the bevel runs out to nothing at the leading edge',
  noseLimit: 'sanding begins here',
  noseGlue: 'glue the leading edge; tape it outside while it sets',
  web: 'the spar web stands here: the middle of its thickness on this line',
  rearWeb: 'the rear web stands here: the middle of its thickness on this line',
  rearEdge: 'rear edge of the lower skin lies here',
  rearFeather: 'sand the inner face to a wedge: at this edge {root} mm stay at the root end, {tip} mm at the tip end',
  station: 'station {mm} mm',
  turbulator: 'turbulator strip, {height} mm high',
  seam: 'glue to the next panel; block it up at its dihedral while it sets',
  webEnds: 'the web ends here: farther on the skins lie closer together than one sheet is thick',
  webAft: 'this face looks aft',
  tubeSeat: '{tube} lies here on the lower skin: glue',
};

const notBuilt = {
  cutouts: 'cutouts in a folded panel',
  tip: 'a folded panel with this tip; it is cut square',
  turning: 'a folded surface that turns as a whole',
  controlReflex: 'a control whose hinge lies ahead of the fold of the reflex',
  through: 'a folded panel takes a tube inside it or let into a face of its skins',
  sparAcrossFold: 'a channel that crosses a fold of the skin',
};

const problems = {
  lowerAhead: 'the lower skin ends at share {to}, not behind the thickest place at {max}: there is no box to fold',
  lowerAheadFix: 'end it behind {max}; {suggest} is where both skins touch',
  lowerTooFar: 'at the {end} the section is only {depth} mm high at share {to}: the upper skin alone fills it',
  lowerTooFarFix: 'end the lower skin at share {most} at most',
  lowerGap:
    'between the rear edge of the lower skin and the upper skin stays a gap of up to {gap} mm, too low for a web',
  lowerGapFix: 'end the lower skin at share {share}, where both touch at the {end}',
  tooThin: 'at the {end} the section is {depth} mm high, and its two skins need {need} mm',
  tooThinFix: 'use a thickness of at least {share} of the chord, a thinner sheet or a longer chord',
  tooThinChordFix: 'make the chord at least {chord} mm there, or choose a thinner sheet',
  noseSharp: 'the leading edge would fold by {angle} degrees; this sheet holds {most}',
  noseSharpFix: 'make the section thicker or move its thickest place forward',
  crestSharp: 'the upper skin would fold by {angle} degrees at its thickest place; this sheet holds {most}',
  crestSharpFix: 'make the section thinner, or choose a paper-faced board',
  noFold: 'this sheet cannot be folded',
  noFoldFix: 'choose a foam board for folded panels',
  webOutside: 'the web stands at share {at}, and the skins are closed around it only from {from} to {to}',
  webOutsideFix: 'set it between {from} and {to}; the thickest place is at {max}',
  webThin: 'between the skins are only {height} mm at the web, less than the sheet of {sheet} mm',
  webThinFix: 'move the web towards the thickest place at {max}, or make the section thicker',
  sparOutside: 'the tube of {tube} mm stands in {room} mm between the skins at the {end}: it lies outside the section',
  sparOutsideFix: 'move it towards the thickest place, end it earlier, or choose a thinner tube',
  sparInWeb: 'this tube runs through the spar web',
  sparInWebFix: 'keep the middle of the tube at least {clear} mm ahead of the web or behind it, all along',
  controlOnLower: 'the hinge lies at share {hinge}, ahead of the rear edge of the lower skin at {to}',
  controlOnLowerFix: 'make the control at most {most} of the chord, or end the lower skin earlier',
};

const ends = { root: 'root', tip: 'tip' };

export const texts = { names, notes, notBuilt, problems, ends };
