import type { Metadata } from 'next';
import { layoutChoices } from '@/app/loaders';
import { BringTry } from '@/components/editor/BringTry';
import { LinkButton } from '@/components/ui/Button';
import { Page } from '@/components/ui/Page';
import { paths } from '@/components/ui/paths';
import { DesignList } from '@/components/workshop/DesignList';
import { NewDesign } from '@/components/workshop/NewDesign';
import { may } from '@/lib/contract/roles';
import { shell, designs as words } from '@/lib/text/en/pages';
import { designsPage } from './loaders';

export const metadata: Metadata = { title: words.title };

export default async function DesignsPage({ params }: { readonly params: Promise<{ workshop: string }> }) {
  const { workshop } = await params;
  const { who, shop, list } = await designsPage(workshop);
  const creates = may(shop.roles, 'design.create');
  const aside = (
    <>
      <LinkButton href={paths.members(workshop)}>{words.members}</LinkButton>
      {creates ? <NewDesign workshopId={workshop} layouts={layoutChoices()} /> : null}
    </>
  );
  return (
    <Page who={who.name} trail={[{ text: shell.workshops, href: '/w' }]} title={shop.name} aside={aside} bench>
      {creates ? <BringTry workshopId={workshop} /> : null}
      {list.length > 0 ? (
        <DesignList workshopId={workshop} designs={list} roles={shop.roles} />
      ) : (
        <div>
          <p>{words.empty}</p>
          <p className="text-ink-soft">{creates ? words.emptyDesigner : words.emptyOther}</p>
        </div>
      )}
    </Page>
  );
}
