/** OWASP ASVS 5.0.0, 6.2.1 asks for 8 at least and recommends 15; ten is ours. */
export const PASSWORD_MIN = 10;
/** ASVS 5.0.0, 6.2.9: at least 64 are accepted. Above this a hash would cost more than a sign-in should. */
export const PASSWORD_MAX = 256;

// Stems that guesses begin with, from memory, no source list. What is left when digits and signs at the ends are taken off is compared.
const COMMON_STEMS = new Set(
  `password passwort passw0rd p@ssword p@ssw0rd motdepasse contrasena qwerty qwertyuiop qwertyui azerty azertyuiop qwertz qwertzuiop asdfghjkl
  asdfasdf asdf zxcvbnm zxcvbn qazwsx qazwsxedc qweasdzxc letmein letmeinnow welcome welcometo iloveyou ilovey0u iloveu sunshine princess football
  baseball basketball superman batman spiderman pokemon dragon monkey master shadow michael jennifer jessica ashley daniel charlie trustno
  changeme changemenow default administrator admin root guest login test testing testtest secret topsecret computer internet whatever
  freedom starwars nothing hello hellohello helloworld access superuser system foldspar abcdefgh abcdefghij abcd abc aeroplane airplane aircraft`
    .split(/\s+/)
    .filter((stem) => stem !== ''),
);

const bare = (text: string): string =>
  text
    .toLowerCase()
    .replace(/[^\p{L}]+$/u, '')
    .replace(/^[^\p{L}]+/u, '');

/** Every character follows the one before it at the same step: "aaaaaaaaaa", "1234567890", "hgfedcba". */
function isRun(text: string): boolean {
  const codes = [...text].map((character) => character.codePointAt(0) ?? 0);
  const steps = new Set(codes.slice(1).map((code, i) => code - (codes[i] ?? 0)));
  // "890" wraps to "0" after "9", so digits count round.
  const wrapped = new Set([...steps].map((step) => (step === -9 ? 1 : step === 9 ? -1 : step)));
  const [only] = wrapped;
  return wrapped.size === 1 && only !== undefined && Math.abs(only) <= 1;
}

/** One short piece over and over: "abcabcabcabc", "2020202020". */
const isRepeated = (text: string): boolean => /^(.{1,5})\1+$/u.test(text);

export type PasswordFault = 'common' | 'holds-name';

/**
 * What makes a password one of the first guesses, or null. There are no rules of composition. Length is checked elsewhere, and one
 * that is too long is not looked at: the time that the patterns take grows with its square.
 */
export function passwordFault(password: string, person: { name?: string; email?: string }): PasswordFault | null {
  if (password.length > PASSWORD_MAX) return null;
  const lower = password.toLowerCase();
  if (isRun(lower) || isRepeated(lower) || COMMON_STEMS.has(bare(lower)) || !/\D/.test(lower.slice(0, -1)))
    return 'common';
  const rest = bare(lower);
  const local = (person.email ?? '').toLowerCase().split('@')[0] ?? '';
  const names = [person.email, local, person.name, person.name?.replaceAll(/\s+/g, '')].map(
    (n) => n?.toLowerCase() ?? '',
  );
  return names.some((name) => name.length >= 4 && (rest === name || lower === name)) ? 'holds-name' : null;
}
