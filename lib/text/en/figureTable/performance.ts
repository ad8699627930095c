export const performanceFigures = {
  stallSpeedMs: {
    name: 'Stall speed',
    explanation: 'The slowest it can fly level, power off.',
    method: 'Weight equals lift at the greatest lift coefficient, air of the given height and temperature.',
    source: 'Flat plate: Pelletier & Mueller, Journal of Aircraft 37 (2000); air: U.S. Standard Atmosphere 1976.',
    limits: 'An estimate: plates stall softly, and the figure for folded sections has to be typed in.',
  },
} as const;
