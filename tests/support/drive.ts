import type { Drive } from '@/lib/airframe/schema/equipment';

type Propelled = Extract<Drive, { kind: 'propeller' }>;

interface DriveWords {
  readonly maxW?: number;
  readonly statedN?: number;
  readonly diameterMm?: number;
  readonly pitchMm?: number;
  readonly blades?: number;
  readonly mirrored?: boolean;
}

/** A propeller drive for tests: nothing says what it gives unless the test does. */
export const drive = ({
  maxW,
  statedN,
  diameterMm = 200,
  pitchMm = 120,
  blades = 2,
  mirrored = false,
}: DriveWords = {}): Propelled => ({
  id: 'drive',
  kind: 'propeller',
  mount: { to: 'datum', at: [-60, mirrored ? 150 : 0, 0] },
  mirrored,
  facing: 'tractor',
  turns: 'cw',
  thrustDeg: [0, 0],
  motor: { massG: 40, diameterMm: 28, lengthMm: 28, kvRpmPerV: 1200, ...(maxW === undefined ? {} : { maxW }) },
  propeller: { diameterMm, pitchMm, blades, massG: 8 },
  ...(statedN === undefined ? {} : { statedThrustN: statedN }),
});
