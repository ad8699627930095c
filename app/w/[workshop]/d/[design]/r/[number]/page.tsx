import type { Metadata } from 'next';
import { ReviewBoard } from '@/components/review/ReviewBoard';
import { ReviewHead } from '@/components/review/ReviewHead';
import { StateBadge } from '@/components/ui/Badge';
import { LinkButton } from '@/components/ui/Button';
import { Page } from '@/components/ui/Page';
import { apiPaths, paths } from '@/components/ui/paths';
import { page as figures } from '@/lib/text/en/figurePages';
import { page as parts } from '@/lib/text/en/partsPage';
import { review as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { designTrail } from '../../trail';
import { reviewPage } from './loaders';
import { revisionNumber } from './number';

type Params = Promise<{ workshop: string; design: string; number: string }>;

export async function generateMetadata({ params }: { readonly params: Params }): Promise<Metadata> {
  return { title: fill(words.title, { number: revisionNumber((await params).number) }) };
}

export default async function ReviewPage({ params }: { readonly params: Params }) {
  const { workshop, design, ...rest } = await params;
  const number = revisionNumber(rest.number);
  const { who, shop, revision, board } = await reviewPage(workshop, design, number);
  const trail = designTrail({
    workshopId: workshop,
    workshopName: shop.name,
    designId: design,
    designName: revision.designName,
  });
  const aside = (
    <>
      <StateBadge state={revision.state} />
      <LinkButton href={paths.revisions(workshop, design)}>{words.revisions}</LinkButton>
      <LinkButton href={paths.figures(workshop, design, number)}>{figures.link}</LinkButton>
      <LinkButton href={paths.setUp(workshop, design, number)}>{figures.setUp}</LinkButton>
      <LinkButton href={paths.parts(workshop, design, number)}>{parts.link}</LinkButton>
      <LinkButton href={paths.print(workshop, design, number)}>{words.print}</LinkButton>
    </>
  );
  return (
    <Page who={who.name} trail={trail} title={fill(words.title, { number })} aside={aside}>
      <ReviewHead revision={revision} />
      <ReviewBoard base={apiPaths.revision(workshop, design, number)} {...board} />
    </Page>
  );
}
