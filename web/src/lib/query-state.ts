'use client';
/** What is shown stands in the address: every view can be sent as a link. */
import { usePathname, useRouter, useSearchParams } from 'next/navigation';
import { useCallback } from 'react';

/** Sets several of the address's parameters at once; an empty value takes one away. */
export function useQueryPatch(): (patch: Readonly<Record<string, string>>) => void {
  const router = useRouter();
  const pathname = usePathname();
  return useCallback(
    (patch) => {
      const next = new URLSearchParams(window.location.search);
      for (const [name, value] of Object.entries(patch)) {
        if (value === '') next.delete(name);
        else next.set(name, value);
      }
      const search = next.toString();
      router.replace(search === '' ? pathname : `${pathname}?${search}`, { scroll: false });
    },
    [pathname, router],
  );
}

export function useQueryState(name: string, fallback: string): [string, (value: string) => void] {
  const search = useSearchParams();
  const patch = useQueryPatch();
  const set = useCallback((value: string) => patch({ [name]: value }), [name, patch]);
  return [search.get(name) ?? fallback, set];
}

/** One of several values; what an old or foreign link asks for and is not among them counts as not asked for. */
export function useQueryChoice(
  name: string,
  options: readonly string[],
  fallback: string,
): [string, (value: string) => void] {
  const [wanted, set] = useQueryState(name, fallback);
  return [options.includes(wanted) ? wanted : fallback, set];
}
