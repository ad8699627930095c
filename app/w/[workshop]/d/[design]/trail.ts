import type { Crumb } from '@/components/ui/Page';
import { paths } from '@/components/ui/paths';
import { shell } from '@/lib/text/en/pages';

interface Place {
  readonly workshopId: string;
  readonly workshopName: string;
  readonly designId: string;
  readonly designName: string;
}

/** The way to a design, for the pages below it. */
export const designTrail = ({ workshopId, workshopName, designId, designName }: Place): readonly Crumb[] => [
  { text: shell.workshops, href: '/w' },
  { text: workshopName, href: paths.workshop(workshopId) },
  { text: designName, href: paths.board(workshopId, designId) },
];
