// What the trim figures say to a person.

const problems = {
  doesNotTrim:
    'the elevator control sits so near the neutral point that up stick does not slow the aircraft: it lifts or sinks without turning the nose',
  doesNotTrimFix: 'move the control further from the neutral point, or give it to a tail or foreplane',
  noTravel: 'it would have to be trimmed nose down, and the elevator control has no travel that way',
  noTravelFix: 'give the control travel the other way, or change incidence, reflex or CG',
  noThrust: 'nothing says what thrust this motor gives, so what the throttle does to the trim cannot be worked out',
  noDrive: 'there is no motor, so there is no thrust line',
} as const;

const causes = {
  neutralPoint: 'the band of the neutral point, and the CG by the masses',
  neutralPointAndClMax: 'the bands of the neutral point and of the greatest lift coefficient, and the CG by the masses',
  thrust: 'the bands of the thrust and of the neutral point, and the CG by the masses',
} as const;

const verdicts = {
  trimGood: 'a small part of the throw',
  trimWatch: 'takes over {limit} % of the throw: set it in the linkage or the incidence, not with the trim lever',
  trimBad: 'takes over {limit} % of the throw: too little is left to fly with',
  trimNone: 'cannot be trimmed at cruise: it would take more than the whole throw',
  stallGood: 'full up stalls it, with some in hand',
  stallShort: 'enough to flare; full up stops just short of the stall',
  cannotFlare: 'cannot flare: full up does not reach {share} % of the greatest lift',
  tooMuchThrow: 'too much throw: under half of it already stalls; fly it on low rates',
  stallsAtRest: 'stalls with the stick at rest',
  stallWeakEnd: 'at the weak end of its band: {words}',
  stallUnsure: 'its band runs from too much throw to too little to flare: try both high up first',
  unstable: 'not stable: the stick has to go the wrong way to hold it',
  throttleNone: 'hardly changes with power',
  throttleUpMore: 'nose up with power: {deg}° of nose-down elevator to hold it; more downthrust lessens that',
  throttleUpLess: 'nose up with power: {deg}° of nose-down elevator to hold it; less downthrust lessens that',
  throttleDownMore: 'nose down with power: {deg}° of nose-up elevator to hold it; more downthrust lessens that',
  throttleDownLess: 'nose down with power: {deg}° of nose-up elevator to hold it; less downthrust lessens that',
  throttleKicks: '{told}; unheld it is worth {g} g at cruise',
  throttleNotHeld: 'more than the whole throw would be needed to hold it with power',
} as const;

const inputs = {
  speed: 'speed',
  fullUp: 'full throw, nose up',
  fullDown: 'full throw, nose down',
  atForeLimit: 'at the forward CG limit',
  atAftLimit: 'at the aft CG limit',
  rest: 'rest position of the control',
  alpha: 'angle of attack',
  clMax: 'greatest lift coefficient',
  shareAtFlare: 'share of the throw for {share} % of it',
  thrust: 'full thrust at that speed',
  perDownthrust: 'change with a degree more of downthrust',
} as const;

const chart = {
  title: 'Elevator to hold a speed',
  speed: 'speed',
  elevator: 'elevator, trailing edge down',
  current: 'CG as it is, power off',
  fore: 'CG at the forward limit',
  aft: 'CG at the aft limit',
  power: 'CG as it is, full throttle',
  stall: 'stall',
  cruise: 'cruise',
  note: 'Slower wants more nose-up elevator when it is stable. A curve stops where the throw ends ({up}° nose up, {down}° nose down from rest). Straight flight, climb angle and propeller stream over the tail left out; near the stall the elevator works less than this.',
} as const;

export const texts = { problems, causes, verdicts, inputs, chart } as const;
