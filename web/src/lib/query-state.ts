'use client';
/** What is shown stands in the address: every view can be sent as a link. */
import { usePathname, useRouter, useSearchParams } from 'next/navigation';
import { useCallback } from 'react';

export function useQueryState(name: string, fallback: string): [string, (value: string) => void] {
  const search = useSearchParams();
  const router = useRouter();
  const pathname = usePathname();
  const set = useCallback(
    (value: string) => {
      const next = new URLSearchParams(window.location.search);
      next.set(name, value);
      router.replace(`${pathname}?${next.toString()}`, { scroll: false });
    },
    [name, pathname, router],
  );
  return [search.get(name) ?? fallback, set];
}
