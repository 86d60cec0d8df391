/** Whoever is not signed in signs in first, and comes back to where he wanted to go. */

const OPEN = ['/sign-in', '/welcome', '/invitation'];

export function askToSignIn(): void {
  const { pathname, search } = window.location;
  if (OPEN.includes(pathname)) return;
  const next = pathname === '/' ? '' : `?${new URLSearchParams({ next: `${pathname}${search}` }).toString()}`;
  window.location.replace(`/sign-in${next}`);
}

/** Where to go once signed in: a place on this server, never another one. */
export function placeAfter(search: string): string {
  const next = new URLSearchParams(search).get('next') ?? '/';
  return /^\/(?![/\\])/.test(next) ? next : '/';
}
