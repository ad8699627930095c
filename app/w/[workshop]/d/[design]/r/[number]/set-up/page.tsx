import type { Metadata } from 'next';
import { PrintButton } from '@/components/figures/PrintButton';
import { PRINT_SHEET } from '@/components/figures/printSheet';
import { SetUpView } from '@/components/figures/SetUpView';
import { StateBadge } from '@/components/ui/Badge';
import { LinkButton } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { Page } from '@/components/ui/Page';
import { paths } from '@/components/ui/paths';
import { page, setUp as words } from '@/lib/text/en/figurePages';
import { review } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { designTrail } from '../../../trail';
import { revisionNumber } from '../number';
import { setUpPage } from './loaders';

type Params = Promise<{ workshop: string; design: string; number: string }>;

export async function generateMetadata({ params }: { readonly params: Params }): Promise<Metadata> {
  return { title: fill(words.title, { number: revisionNumber((await params).number) }) };
}

export default async function SetUpPage({ params }: { readonly params: Params }) {
  const { workshop, design, ...rest } = await params;
  const number = revisionNumber(rest.number);
  const { who, shop, revision, engine, sheet } = await setUpPage(workshop, design, number);
  const place = { workshopId: workshop, workshopName: shop.name, designId: design, designName: revision.designName };
  const trail = [
    ...designTrail(place),
    { text: fill(review.title, { number }), href: paths.review(workshop, design, number) },
  ];
  const aside = (
    <>
      <StateBadge state={revision.state} />
      <LinkButton href={paths.figures(workshop, design, number)}>{page.link}</LinkButton>
      {sheet ? <PrintButton /> : null}
    </>
  );
  const lead = fill(words.lead, { design: revision.designName });
  return (
    <Page who={who.name} trail={trail} title={fill(words.title, { number })} aside={aside} lead={lead} bench>
      <style>{PRINT_SHEET}</style>
      {sheet === undefined ? <Notice tone="watch" title={fill(words.earlier, { engine })} /> : null}
      {sheet === null ? <Notice tone="bad" title={words.failed} /> : null}
      {sheet ? <SetUpView sheet={sheet} /> : null}
    </Page>
  );
}
