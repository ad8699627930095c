// What the people of the demo workshop wrote. Invented throughout.

export const texts = {
  workshop: 'Tarn Lane Workshop',
  tarrel: {
    name: 'Tarrel 620',
    one: {
      reason:
        'Longer booms and a larger tailplane, with the pack further forward to carry them. The first one hunted in pitch at every speed and would not be trimmed.',
      effect: 'More tail volume moves the neutral point aft, so the static margin grows and the hunting should stop.',
      question: 'Is the tailplane still inside one sheet with its hinge strip?',
      answer: 'Yes, both halves come out of one sheet beside each other, with the hinge side along the grain.',
      verdict: 'Tail volume and balance look right. Cut it.',
      finding:
        'Flown twice in light wind. Pitch is calm now. In turns the nose swings left and right two or three times before it settles: the fins look small for the longer nose.',
    },
    two: {
      reason: 'Larger fins. The nose wagged after each turn.',
      effect: 'More fin area behind the CG: the wagging should die out within one swing.',
      hold: 'The larger fins weigh more than the smaller ones, and they sit at the very end. With the pack where it is the CG comes out behind where it was meant to be. Move the pack first.',
      where: 'There is room in the nose for the pack to go further forward.',
    },
    three: {
      reason: 'Pack bay moved forward, to answer the weight of the larger fins.',
      effect: 'CG back inside its range without ballast.',
      verdict: 'Balance answers the hold on revision 2. Good to cut.',
      ask: 'Please check that the pack still passes through the hatch at an angle before the bottom is glued.',
    },
  },
  ombry: {
    name: 'Ombry 1000',
    reason: 'First release of the trainer.',
    effect: 'Slow enough to be learned on, off its wheels, and stable about all three axes.',
    seen: 'Read through, not worked through.',
  },
  quenletSmall: { name: 'Quenlet 700' },
  quenletLarge: { name: 'Quenlet 1050' },
  hask: { name: 'Hask' },
} as const;
