import type { Metadata } from 'next';
import { LinkButton } from '@/components/ui/Button';
import { Page } from '@/components/ui/Page';
import { errors as words } from '@/lib/text/en/pages';
import { currentWho } from '@/server/session';

export const metadata: Metadata = { title: words.notFoundTitle };

export default async function NotFound() {
  const who = await currentWho();
  return (
    <Page who={who?.name ?? null} title={words.notFoundTitle} lead={words.notFoundLead} narrow>
      <div>
        {who === null ? (
          <LinkButton href="/">{words.home}</LinkButton>
        ) : (
          <LinkButton href="/w">{words.toWorkshops}</LinkButton>
        )}
      </div>
    </Page>
  );
}
