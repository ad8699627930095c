import Link from 'next/link';
import type { WorkshopSummary } from '@/lib/contract/answers';
import { workshops as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { paths } from '../ui/paths';
import { rolesText } from '../ui/roleWords';

/** The workshops one belongs to, and as what. */
export function WorkshopList({ workshops }: { readonly workshops: readonly WorkshopSummary[] }) {
  return (
    <ul className="border-t border-ink-soft">
      {workshops.map(({ id, name, roles }) => (
        <li key={id} className="border-b border-rule">
          <Link
            href={paths.workshop(id)}
            className="flex min-h-14 flex-wrap items-center justify-between gap-x-6 py-2 text-ink no-underline hover:underline"
          >
            <span className="heading text-lg">{name}</span>
            <span className="text-sm text-ink-soft">{fill(words.yours, { roles: rolesText(roles) })}</span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
