import type { Metadata } from 'next';
import { PrintAdvice } from '@/components/print/PrintAdvice';
import { PrintDesk } from '@/components/print/PrintDesk';
import { PRINTER_PAPERS } from '@/components/print/papers';
import { StateBadge } from '@/components/ui/Badge';
import { Notice } from '@/components/ui/Notice';
import { Page } from '@/components/ui/Page';
import { apiPaths } from '@/components/ui/paths';
import { print as words } from '@/lib/text/en/pages';
import { designTrail } from '../trail';
import { printDraftPage } from './loaders';

export const metadata: Metadata = { title: words.titleDraft };

type Params = Promise<{ workshop: string; design: string }>;

export default async function PrintDraftPage({ params }: { readonly params: Params }) {
  const { workshop, design } = await params;
  const { who, shop, designName, mayPrint } = await printDraftPage(workshop, design);
  const trail = designTrail({ workshopId: workshop, workshopName: shop.name, designId: design, designName });
  return (
    <Page who={who.name} trail={trail} title={words.titleDraft} aside={<StateBadge state="draft" />} bench>
      <Notice tone="watch" title={mayPrint ? words.draft : words.notYours} />
      {mayPrint ? (
        <div className="grid gap-10 md:grid-cols-2">
          <PrintDesk base={`${apiPaths.design(workshop, design)}/draft`} papers={PRINTER_PAPERS} />
          <div className="grid content-start gap-8">
            <PrintAdvice />
          </div>
        </div>
      ) : null}
    </Page>
  );
}
