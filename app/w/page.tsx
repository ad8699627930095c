import type { Metadata } from 'next';
import { LinkButton } from '@/components/ui/Button';
import { Page, Section } from '@/components/ui/Page';
import { CreateWorkshop } from '@/components/workshop/CreateWorkshop';
import { WorkshopList } from '@/components/workshop/WorkshopList';
import { front, workshops as words } from '@/lib/text/en/pages';
import { myWorkshops } from '@/server/read/workshops';
import { requireWho } from '@/server/session';

export const metadata: Metadata = { title: words.title };

export default async function WorkshopsPage() {
  const who = await requireWho();
  const workshops = await myWorkshops(who);
  return (
    <Page who={who.name} title={words.title} lead={words.lead}>
      {workshops.length > 0 ? (
        <WorkshopList workshops={workshops} />
      ) : (
        <div className="grid justify-items-start gap-3">
          <p>{words.empty}</p>
          <p className="text-ink-soft">{words.emptyTry}</p>
          <LinkButton href="/try">{front.tryBoard}</LinkButton>
        </div>
      )}
      <Section title={words.create}>
        <CreateWorkshop />
      </Section>
    </Page>
  );
}
