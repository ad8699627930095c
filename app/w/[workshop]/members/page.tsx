import type { Metadata } from 'next';
import { type Crumb, Page, Section } from '@/components/ui/Page';
import { paths } from '@/components/ui/paths';
import { InvitationTable, InviteForm } from '@/components/workshop/Invitations';
import { MemberTable } from '@/components/workshop/MemberTable';
import { may } from '@/lib/contract/roles';
import { shell, members as words } from '@/lib/text/en/pages';
import { membersPage } from '../loaders';

export const metadata: Metadata = { title: words.title };

export default async function MembersPage({ params }: { readonly params: Promise<{ workshop: string }> }) {
  const { workshop } = await params;
  const { who, shop, people, invited } = await membersPage(workshop);
  const mayChange = may(shop.roles, 'member.setRoles');
  const trail: Crumb[] = [
    { text: shell.workshops, href: '/w' },
    { text: shop.name, href: paths.workshop(workshop) },
  ];
  return (
    <Page who={who.name} trail={trail} title={words.title} lead={mayChange ? undefined : words.ownerOnly}>
      <MemberTable workshopId={workshop} members={people} myUserId={who.userId} mayChange={mayChange} />
      {may(shop.roles, 'invitation.create') ? (
        <div className="grid gap-10 lg:grid-cols-[minmax(0,1fr)_minmax(0,460px)]">
          <Section title={words.invitations} id="invitations">
            <InvitationTable workshopId={workshop} invitations={invited} />
          </Section>
          <Section title={words.invite} id="invite">
            <InviteForm workshopId={workshop} />
          </Section>
        </div>
      ) : null}
    </Page>
  );
}
