/** Where signing in may lead: the pages that send somebody here first. A list leaves no room for an address on another site. */
export function nextPath(wanted: string | undefined) {
  if (wanted === '/try') return wanted;
  const invitation = /^\/invite\/([A-Za-z0-9_-]{1,200})$/.exec(wanted ?? '')?.[1];
  if (invitation !== undefined) return `/invite/${invitation}` as const;
  const workshop = /^\/w\/([A-Za-z0-9-]{1,64})$/.exec(wanted ?? '')?.[1];
  return workshop === undefined ? '/w' : (`/w/${workshop}` as const);
}
