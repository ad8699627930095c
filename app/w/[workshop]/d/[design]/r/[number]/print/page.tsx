import type { Metadata } from 'next';
import { PrintAdvice } from '@/components/print/PrintAdvice';
import { PrintDesk } from '@/components/print/PrintDesk';
import { PRINTER_PAPERS } from '@/components/print/papers';
import { WatchRevisions } from '@/components/release/WatchRevisions';
import { StateBadge } from '@/components/ui/Badge';
import { Notice } from '@/components/ui/Notice';
import { Page } from '@/components/ui/Page';
import { apiPaths, paths } from '@/components/ui/paths';
import { print as words } from '@/lib/text/en/pages';
import { review } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { designTrail } from '../../../trail';
import { revisionPage } from '../loaders';
import { revisionNumber } from '../number';

type Params = Promise<{ workshop: string; design: string; number: string }>;

export async function generateMetadata({ params }: { readonly params: Params }): Promise<Metadata> {
  return { title: fill(words.titleRevision, { number: revisionNumber((await params).number) }) };
}

export default async function PrintRevisionPage({ params }: { readonly params: Params }) {
  const { workshop, design, ...rest } = await params;
  const number = revisionNumber(rest.number);
  const { who, shop, revision } = await revisionPage(workshop, design, number);
  const base = apiPaths.revision(workshop, design, number);
  const trail = [
    ...designTrail({
      workshopId: workshop,
      workshopName: shop.name,
      designId: design,
      designName: revision.designName,
    }),
    { text: fill(review.title, { number }), href: paths.review(workshop, design, number) },
  ];
  const title = fill(words.titleRevision, { number });
  return (
    <Page who={who.name} trail={trail} title={title} aside={<StateBadge state={revision.state} />} bench>
      <WatchRevisions base={apiPaths.revisions(workshop, design)} revisions={[revision]} only={number} />
      {revision.state === 'held' ? <Notice tone="bad" title={words.held} /> : null}
      <div className="grid gap-10 md:grid-cols-2">
        <PrintDesk base={base} papers={PRINTER_PAPERS} exportHref={`${base}/export`} />
        <div className="grid content-start gap-8">
          <PrintAdvice />
        </div>
      </div>
    </Page>
  );
}
