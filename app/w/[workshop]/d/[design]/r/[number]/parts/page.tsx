import type { Metadata } from 'next';
import { BeforeYouCut, CutParts } from '@/components/parts/PartsPage';
import { ProblemList } from '@/components/release/DraftLine';
import { StateBadge } from '@/components/ui/Badge';
import { LinkButton } from '@/components/ui/Button';
import { Page } from '@/components/ui/Page';
import { paths } from '@/components/ui/paths';
import { page as words } from '@/lib/text/en/partsPage';
import { review } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { designTrail } from '../../../trail';
import { revisionNumber } from '../number';
import { partsPage } from './loaders';

type Params = Promise<{ workshop: string; design: string; number: string }>;

export async function generateMetadata({ params }: { readonly params: Params }): Promise<Metadata> {
  return { title: fill(words.title, { number: revisionNumber((await params).number) }) };
}

export default async function PartsPage({ params }: { readonly params: Params }) {
  const { workshop, design, ...rest } = await params;
  const number = revisionNumber(rest.number);
  const { who, shop, revision, problems, ...content } = await partsPage(workshop, design, number);
  const place = { workshopId: workshop, workshopName: shop.name, designId: design, designName: revision.designName };
  const trail = [
    ...designTrail(place),
    { text: fill(review.title, { number }), href: paths.review(workshop, design, number) },
  ];
  const aside = (
    <>
      <StateBadge state={revision.state} />
      <LinkButton href={paths.print(workshop, design, number)}>{review.print}</LinkButton>
    </>
  );
  return (
    <Page who={who.name} trail={trail} title={fill(words.title, { number })} aside={aside} lead={words.lead} bench>
      <ProblemList problems={problems} />
      <BeforeYouCut {...content} />
      <CutParts {...content} />
    </Page>
  );
}
