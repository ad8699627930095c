import { ROLES, type Role } from '@/lib/contract/roles';
import { roles as words } from '@/lib/text/en/pages';
import type { Choice } from './Choices';

/** The four roles as choices, each with what it is for. */
export const ROLE_CHOICES: readonly Choice<Role>[] = ROLES.map((value) => ({
  value,
  label: words[value].name,
  hint: words[value].what,
}));

/** "owner, designer" in the order of the contract. */
export const rolesText = (held: readonly Role[]): string =>
  ROLES.filter((role) => held.includes(role))
    .map((role) => words[role].name.toLowerCase())
    .join(', ');
