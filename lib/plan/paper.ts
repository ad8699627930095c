import type { Paper } from './drawing';

// Paper sizes, portrait, mm. ISO 216 for A0 to A4; ANSI/ASME Y14.1 for Letter (A) to ANSI E, in inches of 25.4 mm. Legal is
// 8.5 x 14 in (common practice).

const inches = (value: number): number => Math.round(value * 25.4 * 1000) / 1000;

export const PAPERS = {
  a4: { id: 'a4', name: 'A4', wMm: 210, hMm: 297 },
  a3: { id: 'a3', name: 'A3', wMm: 297, hMm: 420 },
  a2: { id: 'a2', name: 'A2', wMm: 420, hMm: 594 },
  a1: { id: 'a1', name: 'A1', wMm: 594, hMm: 841 },
  a0: { id: 'a0', name: 'A0', wMm: 841, hMm: 1189 },
  letter: { id: 'letter', name: 'Letter', wMm: inches(8.5), hMm: inches(11) },
  legal: { id: 'legal', name: 'Legal', wMm: inches(8.5), hMm: inches(14) },
  tabloid: { id: 'tabloid', name: 'Tabloid (ANSI B)', wMm: inches(11), hMm: inches(17) },
  'ansi-c': { id: 'ansi-c', name: 'ANSI C', wMm: inches(17), hMm: inches(22) },
  'ansi-d': { id: 'ansi-d', name: 'ANSI D', wMm: inches(22), hMm: inches(34) },
  'ansi-e': { id: 'ansi-e', name: 'ANSI E', wMm: inches(34), hMm: inches(44) },
} as const satisfies Record<string, Paper>;
export type PaperId = keyof typeof PAPERS;

/** The paper of that id, or null. */
export function paperById(id: string): Paper | null {
  return Object.values(PAPERS).find((paper) => paper.id === id) ?? null;
}

/** Edges that a printer cannot reach, mm. `endsMm` are the leading and trailing ends, `sidesMm` the long edges. */
export interface PrinterMargins {
  readonly sidesMm: number;
  readonly endsMm: number;
}

/** Common practice, no source: 6.4 mm all round. */
export const PRINTER_MARGINS: PrinterMargins = { sidesMm: 6.4, endsMm: 6.4 };
/** Common practice, no source: older inkjets leave 13 mm at the trailing end. Which end that is depends on the driver, so both keep it. */
export const INKJET_MARGINS: PrinterMargins = { sidesMm: 6.4, endsMm: 13 };
