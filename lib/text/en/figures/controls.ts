// What the figures of controls and linkages say: causes of bands, names of inputs, verdicts, problems and the chart.

const problems = {
  tooFar: 'no usual arm and horn turns this control through its whole throw',
  tooFarFix: 'make the throw smaller',
  noServo: 'this servo has no place, so the rod cannot be worked out',
  hornOff: 'the horn stands beside the control, not on it',
  hornOffFix: 'put the horn between the ends of the control',
  tooClose: 'the servo is nearer to the horn than its arm is long, so there is no room for a rod',
  tooCloseFix: 'move the servo away from the hinge, or take a shorter arm',
  deadCentre: 'the linkage comes to a dead centre, rod in line with arm or horn, before the control has its throw',
  deadCentreFix: 'take a longer horn, or a smaller throw',
  noControls: 'there is no control that moves',
  noRod: 'no linkage is in the document, so the rod is not known; {diameter} mm wire may run free up to {free} mm',
} as const;

const causes = {
  torque: 'hinge moment at low Reynolds numbers',
  torqueAssumed: 'hinge moment at low Reynolds numbers, and a servo torque guessed from its mass',
  slop: 'play of the holes and centring of the servo',
} as const;

/** Before a verdict, where the document has no linkage. */
const suggested = '{control}, with arm {arm} and horn {horn} mm: {verdict}';
const typed = '{control}: {verdict}';

const verdicts = {
  torqueGood: 'strong enough',
  torqueWatch: 'no reserve in a dive, watch it',
  torqueBad: 'too weak',
  travelLow: 'uses little of the servo travel: shorter arm or longer horn',
  travelGood: 'servo travel well used',
  travelHigh: 'a little over the servo travel: longer arm or shorter horn',
  travelBad: 'more than the servo has: longer arm or shorter horn',
  slopGood: 'tight',
  slopWatch: 'loose: trim will wander',
  slopBad: 'very loose: may flutter',
  rodGood: 'stiff enough',
  rodWatch: 'guide the rod every {mm} mm',
  rodBad: 'would bow: guide it every {mm} mm',
} as const;

const inputs = {
  speed: 'highest level speed',
  speedAssumed: 'highest level speed, assumed from cruise',
  turn: 'throw from neutral',
  moment: 'hinge moment at twice that speed',
  servoTorque: 'servo stall torque',
  servoTorqueAssumed: 'servo stall torque, not typed: assumed from its mass',
  arm: 'servo arm',
  horn: 'horn',
  armSuggested: 'servo arm, suggested',
  hornSuggested: 'horn, suggested',
  rodLength: 'rod between its holes',
  rodDiameter: 'rod diameter',
  rodForce: 'force in the rod',
  servoUp: 'servo turn for full up',
  servoDown: 'servo turn for full down',
  play: 'play at each rod end',
  centring: 'servo centring',
  widest: 'widest chord of the control',
} as const;

const chart = {
  title: 'Surface against servo: {control}',
  servo: 'servo arm',
  surface: 'surface, trailing edge down',
  curve: 'linkage',
  straight: 'gear ratio at neutral',
  fullUp: 'full up',
  fullDown: 'full down',
  note: 'Flatter towards the ends means less throw for the last of the stick. Rod at a right angle to the arm at neutral; the servo shaft is taken at the middle of the servo.',
  noteSuggested:
    'Flatter towards the ends means less throw for the last of the stick. No linkage is in the document: this is the suggested one, with a rod of {rod} mm.',
} as const;

const control = '{surface}, {control}';

export const texts = { problems, causes, suggested, typed, verdicts, inputs, chart, control } as const;
