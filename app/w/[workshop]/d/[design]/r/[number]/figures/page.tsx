import type { Metadata } from 'next';
import { FigureList } from '@/components/figures/FigureList';
import { UnitsLink } from '@/components/figures/UnitsLink';
import { systemFrom } from '@/components/figures/units';
import { ProblemList } from '@/components/release/DraftLine';
import { StateBadge } from '@/components/ui/Badge';
import { LinkButton } from '@/components/ui/Button';
import { Page } from '@/components/ui/Page';
import { paths } from '@/components/ui/paths';
import { page as words } from '@/lib/text/en/figurePages';
import { review } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { designTrail } from '../../../trail';
import { revisionNumber } from '../number';
import { figuresPage } from './loaders';

interface Props {
  readonly params: Promise<{ workshop: string; design: string; number: string }>;
  readonly searchParams: Promise<{ units?: string | string[] }>;
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: fill(words.title, { number: revisionNumber((await params).number) }) };
}

export default async function FiguresPage({ params, searchParams }: Props) {
  const { workshop, design, ...rest } = await params;
  const number = revisionNumber(rest.number);
  const system = systemFrom((await searchParams).units);
  const { who, shop, revision, rows, charts, engine, problems } = await figuresPage(workshop, design, number, system);
  const place = { workshopId: workshop, workshopName: shop.name, designId: design, designName: revision.designName };
  const trail = [
    ...designTrail(place),
    { text: fill(review.title, { number }), href: paths.review(workshop, design, number) },
  ];
  const aside = (
    <>
      <StateBadge state={revision.state} />
      <UnitsLink path={paths.figures(workshop, design, number)} system={system} />
      <LinkButton href={paths.setUp(workshop, design, number)}>{words.setUp}</LinkButton>
    </>
  );
  return (
    <Page who={who.name} trail={trail} title={fill(words.title, { number })} aside={aside} lead={words.lead}>
      <ProblemList problems={problems} />
      {charts === null ? <p className="text-sm text-ink-soft">{fill(words.noCharts, { engine })}</p> : null}
      <FigureList rows={rows} charts={charts ?? []} system={system} level="h2" />
    </Page>
  );
}
