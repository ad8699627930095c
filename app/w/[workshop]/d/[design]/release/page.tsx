import type { Metadata } from 'next';
import { TitleBlock } from '@/components/figures/TitleBlock';
import { ChangeTable } from '@/components/release/ChangeTable';
import { DraftLine, ProblemList } from '@/components/release/DraftLine';
import { ReleaseForm } from '@/components/release/ReleaseForm';
import { Notice } from '@/components/ui/Notice';
import { Page, Section } from '@/components/ui/Page';
import { release as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { designTrail } from '../trail';
import { releasePage } from './loaders';

export const metadata: Metadata = { title: words.title };

type Params = Promise<{ workshop: string; design: string }>;

export default async function ReleasePage({ params }: { readonly params: Params }) {
  const { workshop, design } = await params;
  const { who, shop, draft, mayRelease, problems, rows, newest, before } = await releasePage(workshop, design);
  const trail = designTrail({
    workshopId: workshop,
    workshopName: shop.name,
    designId: design,
    designName: draft.designName,
  });
  const beforeName = fill(words.was, { number: newest });
  return (
    <Page who={who.name} trail={trail} title={words.title} lead={words.lead}>
      <div className="grid gap-10 lg:grid-cols-[minmax(0,1fr)_minmax(0,460px)]">
        <div className="grid content-start gap-10">
          <Section title={words.deciding} aside={<DraftLine draft={draft} />} id="deciding">
            <ProblemList problems={problems} />
            <TitleBlock rows={rows} before={before?.rows} beforeName={beforeName} label={words.deciding} />
          </Section>
          <Section title={fill(words.changes, { number: newest })} id="changes">
            {before === null ? (
              <p className="text-ink-soft">{words.firstChanges}</p>
            ) : (
              <ChangeTable changes={before.changes} since={newest} />
            )}
          </Section>
        </div>
        {mayRelease ? (
          <ReleaseForm workshopId={workshop} designId={design} draftVersion={draft.version} nextNumber={newest + 1} />
        ) : (
          <Notice tone="watch" title={words.notYours} />
        )}
      </div>
    </Page>
  );
}
