import { randomBytes } from 'node:crypto';
import type { Role } from '@/lib/contract/roles';
import { getAuth } from '@/server/auth';
import type { Who } from '@/server/context';
import type { Db } from '../types';

/** Someone of the demo workshop, and how they sign in. */
export interface SignIn {
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly password: string;
}

/** example.test never resolves (RFC 6761), so no mail of the demo can reach anybody. */
export const CAST = {
  ines: { name: 'Ines Okafor', email: 'ines.okafor@example.test', roles: ['owner', 'designer'] },
  piet: { name: 'Piet Lindqvist', email: 'piet.lindqvist@example.test', roles: ['builder'] },
  marguerite: { name: 'Marguerite Adeyemi', email: 'marguerite.adeyemi@example.test', roles: ['reviewer'] },
  tomas: { name: 'Tomas Reyes', email: 'tomas.reyes@example.test', roles: ['designer'] },
} as const satisfies Record<string, Omit<SignIn, 'password'>>;
export type CastId = keyof typeof CAST;

/** Makes the account through the identity service, with a password that nobody has chosen and an address that counts as confirmed. */
export async function createPerson(db: Db, person: Omit<SignIn, 'password'>): Promise<{ who: Who; signIn: SignIn }> {
  const { internalAdapter, password: passwords } = await (await getAuth(db)).$context;
  const password = randomBytes(15).toString('base64url');
  const { name, email } = person;
  const user = await internalAdapter.createUser({ name, email, emailVerified: true }, { method: 'email-password' });
  const hash = await passwords.hash(password);
  await internalAdapter.linkAccount({ userId: user.id, providerId: 'credential', accountId: user.id, password: hash });
  return { who: { userId: user.id, name, email }, signIn: { ...person, password } };
}
