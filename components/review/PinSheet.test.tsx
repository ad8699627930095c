import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import tarrel from '@/examples/tarrel-620.json';
import { planOutlines } from '@/lib/airframe/outlines';
import { parseAirframe } from '@/lib/airframe/parse';
import type { ThreadAnswer } from '@/lib/contract/answers';
import type { FigureMarks } from '@/lib/figures/types';
import { elementList } from './elements';
import { PinSheet } from './PinSheet';

const parsed = parseAirframe(tarrel);
if (!parsed.ok) throw new RangeError(`the example does not open: ${parsed.problems[0]?.message}`);
const airframe = parsed.value;
const subjects = { outlines: planOutlines(airframe), elements: elementList(airframe), parts: [], figures: [] };

const marks: FigureMarks = {
  mac: { lengthMm: 171, leXMm: 0, yMm: 146, zMm: 0 },
  aerodynamicCentreXMm: 43,
  neutralPointXMm: 71,
  neutralPointBandXMm: [65, 77],
  cgRangeXMm: [50, 60],
  firstFlightCgXMm: 52,
  cg: [55, 0, 0],
};
const thread = (number: number, over: Partial<ThreadAnswer>): ThreadAnswer => ({
  id: `t${number}`,
  number,
  anchor: { kind: 'element', key: 'wing/aileron' },
  state: 'open',
  closedBy: null,
  comments: [],
  ...over,
});

const draw = (threads: readonly ThreadAnswer[], selected: string | null = null) =>
  renderToStaticMarkup(
    <PinSheet
      name="Tarrel 620"
      subjects={subjects}
      marks={marks}
      threads={threads}
      draft={null}
      selected={selected}
      onPlace={() => {}}
      onKey={() => {}}
      onSelect={() => {}}
    />,
  );

describe('PinSheet', () => {
  it('says of each pin its number, state and place', () => {
    const html = draw([
      thread(7, {}),
      thread(8, { state: 'closed', anchor: { kind: 'point', view: 'plan', mm: [-40, 0] } }),
    ]);
    expect(html).toContain('aria-label="Comment 7, open: aileron of the wing"');
    expect(html).toContain('aria-label="Comment 8, closed: 40 mm ahead, 0 mm to starboard"');
  });
  it('draws no pin for a figure', () => {
    expect(draw([thread(9, { anchor: { kind: 'figure', key: 'stallSpeedMs' } })])).not.toContain('Comment 9');
  });
  it('shows which pin is selected, and draws its element in the colour of what is selected', () => {
    const count = (html: string) => html.split('stroke="var(--tape)"').length - 1;
    expect(count(draw([thread(7, {})]))).toBe(0);
    // Both ailerons: starboard and port.
    expect(count(draw([thread(7, {})], 't7'))).toBe(2);
    expect(draw([thread(7, {})], 't7')).toContain('aria-pressed="true"');
  });
  it('draws every outline of the aircraft once', () => {
    expect(draw([]).match(/<path d="M[^"]*" fill=[^>]*vector-effect/g)).toHaveLength(subjects.outlines.length);
  });
});
