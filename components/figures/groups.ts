import type { Chart, ChartId } from '@/lib/figures/charts';
import { FIGURE_GROUPS, type FigureGroup } from '@/lib/figures/table';
import type { Verdict } from '@/lib/figures/types';
import type { FigureRow } from './rows';

export type GroupId = FigureRow['group'];

/** Figures and charts under one heading. */
export interface RowGroup {
  readonly id: GroupId;
  readonly rows: readonly FigureRow[];
  readonly charts: readonly Chart[];
  readonly count: Readonly<Record<Verdict, number>>;
}

const CHART_GROUPS: Readonly<Record<ChartId, FigureGroup>> = {
  pitchStep: 'handling',
  rollStep: 'handling',
  yawRelease: 'handling',
  trimSpeed: 'trim',
  powerRequired: 'performance',
  throwTravel: 'controls',
};
// A frozen chart may be of a kind that is gone.
const groupOfChart = new Map<string, FigureGroup>(Object.entries(CHART_GROUPS));

/** Watch and bad are what a person has to look at. */
export const needsLook = ({ verdict }: FigureRow): boolean => verdict !== undefined && verdict.level !== 'good';

/** How many verdicts there are of each kind. */
export function countVerdicts(rows: readonly FigureRow[]): Readonly<Record<Verdict, number>> {
  const count = { good: 0, watch: 0, bad: 0 };
  for (const { verdict } of rows) if (verdict !== undefined) count[verdict.level] += 1;
  return count;
}

const ORDER: readonly GroupId[] = [...FIGURE_GROUPS, 'other'];

/** Rows and charts under their headings, in the order of the table; a heading with nothing under it is left out. */
export function rowGroups(rows: readonly FigureRow[], charts: readonly Chart[] = []): readonly RowGroup[] {
  return ORDER.map((id) => {
    const own = rows.filter(({ group }) => group === id);
    return {
      id,
      rows: own,
      charts: charts.filter((chart) => (groupOfChart.get(chart.id) ?? 'other') === id),
      count: countVerdicts(own),
    };
  }).filter((group) => group.rows.length > 0 || group.charts.length > 0);
}
