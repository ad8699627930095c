// What the check before cutting says to a builder. {names} are filled with numbers and names that can be read as they stand.

const sources = {
  CP: 'common practice, no source',
  M: 'from memory: check it on the bench',
} as const;

/** Every rule by its id: what it is called, and what is done about it when it is not kept. */
const rules = {
  'propeller-clearance': {
    title: 'Propeller clear of everything beside it',
    fix: 'move the motor away from it, move the part, or take a smaller propeller',
  },
  'propeller-largest': {
    title: 'Largest propeller between the booms',
    fix: 'take a propeller of {largest} mm or less, or set the booms further apart',
  },
  'ground-clearance-level': {
    title: 'Propeller over the ground, standing level',
    fix: 'lengthen the legs, raise the motor or take a smaller propeller',
  },
  'ground-clearance-tail-down': {
    title: 'Propeller over the ground, tail down',
    fix: 'lengthen the legs, raise the motor, or let a skid at the tail touch first',
  },
  'boxes-meet': {
    title: 'Equipment does not meet',
    fix: 'move one of them by at least {by} mm',
  },
  'pack-hatch': {
    title: 'Pack passes its hatch',
    fix: 'make the opening at least {long} x {wide} mm and keep it clear of the formers',
  },
  'pack-slide': {
    title: 'Room for the pack to slide',
    fix: 'shorten the slide to {from} to {to} mm, or move what stands in the way',
  },
  'motor-screws': {
    title: 'Motor screws can be reached',
    fix: 'cut an opening near the firewall, or stand the motor outside it',
  },
  'firewall-load-path': {
    title: 'Firewall holds the motor',
    fix: 'glue doublers to both sides at the firewall, or take a thicker one',
  },
  'cooling-inlet': {
    title: 'Air in for the motor and controller',
    fix: 'cut inlets of {need} cm² together in {body}, where the air meets it',
  },
  'cooling-outlet': {
    title: 'Air out again',
    fix: 'open {least} to {most} cm² behind what must be cooled',
  },
  'fan-inlet': {
    title: 'Fan gets its air',
    fix: 'open the inlet to {need} cm² or more, all the way to the fan',
  },
  'fan-exit': {
    title: 'Fan exit matches the fan',
    fix: 'make the exit {least} to {most} cm²',
  },
  'aerial-carbon': {
    title: 'Receiver clear of carbon',
    fix: 'move the receiver, or lead its aerials {limit} mm away from the carbon and at right angles to each other',
  },
  'hinge-moment': {
    title: 'Servo strong enough for its control',
    fix: 'take a stronger servo, a longer horn or a shorter arm, or a narrower control',
  },
  'spar-reach': {
    title: 'Spar reaches past the control',
    fix: 'let the spar run to at least {least} mm from the root',
  },
  'spar-joint': {
    title: 'Spar does not end at a joint',
    fix: 'let it run straight through, or lay a joiner across the joint',
  },
  'hand-hold': {
    title: 'Where to hold it for the throw',
    fix: 'keep {least} mm of the bottom free under the CG, away from the propeller, or glue on a grip',
  },
  'right-way-up': {
    title: 'Seen the right way up',
    fix: 'give top and bottom different colours, or one wing tip a stripe',
  },
  'wing-off': {
    title: 'Wing comes off for the car',
    fix: 'join the wing with bands, bolts or a tube',
  },
  'breaks-first': { title: 'What breaks first', fix: 'keep a spare of it' },
} as const;

const words = {
  propellerClear: '{mm} mm to {what} with the shaft bent {flex}°; {limit} mm wanted',
  propellerMeets: 'with the shaft bent {flex}° the blades meet {what}; {limit} mm wanted',
  propellerNothing: 'nothing stands beside it',
  largest: 'the booms leave room for {largest} mm; this one has {has} mm',
  ground: '{mm} mm from the blade tip to the ground; {limit} mm wanted',
  groundMeets: 'the blades reach {mm} mm into the ground; {limit} mm of air wanted',
  boxesApart: 'closest: {one} and {other}, {mm} mm apart',
  boxesMeet: '{one} and {other} lie {mm} mm into each other',
  hatchFlat: 'the opening has {long} x {wide} mm, the pack needs {packLong} x {packWide} mm',
  hatchTilted:
    'the opening has {long} x {wide} mm: the pack of {packLong} x {packWide} mm goes in only tilted, end first',
  hatchNone: 'no opening or open end leads to where the pack lies',
  hatchSmall: 'the largest way in has {long} x {wide} mm, the pack needs {packLong} x {packWide} mm',
  hatchEnd: 'it goes in through the open end of {long} x {wide} mm; the pack needs {packLong} x {packWide} mm',
  slideFits: 'it can go {fore} mm forward and {aft} mm aft; its slide asks for {from} to {to} mm',
  slidePlace: 'it stands {mm} mm into the wall, a former or something else where it is now',
  slideFirstFlight: 'for the first flight it goes {move} mm, and there is room for {from} to {to} mm',
  screwsOutside: 'the motor stands outside {body}',
  screwsNear: '{mm} mm from the screws to the nearest opening or open end; {limit} mm wanted',
  screwsClosed: 'no opening leads to the screws',
  firewallNone: 'no firewall stands behind the motor in {body}',
  firewallDoublers: 'doublers on both sides meet the firewall; its edges give {area} cm² of glue',
  firewallGlue: 'its edges give {area} cm² of glue; {need} cm² wanted for {load} N in a hard landing',
  inlet: 'inlets of {has} cm² for {power} W; {need} cm² wanted',
  outlet: 'outlets of {has} cm² for {inlet} cm² of inlet; {least} to {most} times as much wanted',
  fanInlet: 'the smallest inlet has {has} cm², {pct} % of the swept area; {limit} % or more wanted',
  fanExit: 'the exit has {has} cm², {pct} % of the swept area; {least} to {most} % wanted',
  fanInletUnknown: 'nothing says how large the inlet is',
  fanExitUnknown: 'nothing says how large the exit is',
  aerial: '{mm} mm from the receiver to {what}; {limit} mm wanted for its aerials',
  hinge: 'full throw in a dive takes {pct} % of the servo; {limit} % or less wanted',
  sparReach: 'it ends {has} mm from the root; {control} begins at {least} mm',
  sparClear: 'its ends stand {mm} mm or more from every joint; {limit} mm wanted',
  sparMeets: 'it ends {mm} mm from a joint between panels; {limit} mm wanted, for a joint alone carries little',
  sparHalves: 'the two halves end at the middle, where the wing bends most, and nothing goes across',
  holdFree: '{has} mm of its bottom are free under the CG; {least} mm wanted',
  holdPropeller: 'the hand would be {has} mm from the propeller; {least} mm wanted',
  holdWide: 'the body is {has} mm wide at the CG; {least} to {most} mm fit a hand',
  holdNone: 'there is no body under the CG: decide where to hold it, and mark the place',
  coverings: 'coverings named on the flying surfaces: {count}; it can look the same from above and below',
  coveringsDiffer: 'coverings to tell its attitude by: {count}',
  wingFixed: '{span} mm in one piece: look whether it goes into the car',
  wingLoose: '{span} mm, and the wing is joined by {joint}',
  wingSmall: '{span} mm in one piece; up to {limit} mm goes into most cars',
  breaksTractor: 'in a hard landing the propeller and the motor mount come first',
  breaksPack: 'in a hard landing the pack comes forward and the nose takes it',
  breaksWing: 'in a hard landing the nose edge of the wing takes it',
  breaksBands: 'bands let the wing go before it breaks',
} as const;

/** What is done instead where a rule is broken in another way. */
const fixes = {
  packPlace: 'move the pack or what it meets, or take a smaller pack',
} as const;

const things = {
  boom: '{name}',
  surface: '{name}',
  control: '{control} of {name}, moved',
  rod: 'the rod of {control}',
  former: 'former {id}',
  body: '{name}',
  spar: 'the tube "{name}"',
} as const;

const joints = { bands: 'bands', bolts: 'bolts', tube: 'a tube', glued: 'glue' } as const;

export const texts = { sources, rules, fixes, words, things, joints } as const;
