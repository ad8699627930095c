import type { Metadata } from 'next';
import { RevisionList } from '@/components/release/RevisionList';
import { WatchRevisions } from '@/components/release/WatchRevisions';
import { LinkButton } from '@/components/ui/Button';
import { Page } from '@/components/ui/Page';
import { apiPaths, paths } from '@/components/ui/paths';
import { designs, revisions as words } from '@/lib/text/en/pages';
import { designTrail } from '../trail';
import { revisionsPage } from './loaders';

export const metadata: Metadata = { title: words.title };

type Params = Promise<{ workshop: string; design: string }>;

export default async function RevisionsPage({ params }: { readonly params: Params }) {
  const { workshop, design } = await params;
  const { who, shop, designName, list, mayRelease, mayPrintDraft } = await revisionsPage(workshop, design);
  const trail = designTrail({ workshopId: workshop, workshopName: shop.name, designId: design, designName });
  const aside = (
    <>
      {mayPrintDraft ? <LinkButton href={paths.printDraft(workshop, design)}>{designs.printDraft}</LinkButton> : null}
      {mayRelease ? (
        <LinkButton href={paths.release(workshop, design)} weight="primary">
          {words.release}
        </LinkButton>
      ) : null}
    </>
  );
  return (
    <Page who={who.name} trail={trail} title={words.title} aside={aside} bench>
      <WatchRevisions base={apiPaths.revisions(workshop, design)} revisions={list} />
      {list.length > 0 ? (
        <RevisionList workshopId={workshop} designId={design} revisions={list} />
      ) : (
        <p className="text-ink-soft">{words.empty}</p>
      )}
    </Page>
  );
}
