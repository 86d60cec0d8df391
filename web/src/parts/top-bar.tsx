'use client';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useEffect, useState } from 'react';
import { api } from '@/lib/api';

export function TopBar() {
  const me = useQuery({ queryKey: ['me'], queryFn: api.me });
  const client = useQueryClient();
  const router = useRouter();
  const signOut = async (): Promise<void> => {
    await api.signOut();
    client.clear();
    router.push('/sign-in');
  };
  return (
    <header className="top">
      <Link href="/" className="mark">
        Groundward
      </Link>
      <span className="note hide-narrow">from every diaphragm to the foundation</span>
      <span className="end">
        <Theme />
        {me.data !== undefined && (
          <>
            <span className="hide-narrow">{me.data.name}</span>
            <button className="quiet" onClick={() => void signOut()}>
              Sign out
            </button>
          </>
        )}
      </span>
    </header>
  );
}

const THEMES = { system: 'Light or dark as the system', light: 'Light', dark: 'Dark' } as const;
type ThemeName = keyof typeof THEMES;

function Theme() {
  const [theme, setTheme] = useState<ThemeName>('system');
  useEffect(() => {
    const stored = window.localStorage.getItem('theme');
    if (stored === 'light' || stored === 'dark') setTheme(stored);
  }, []);
  useEffect(() => {
    if (theme === 'system') document.documentElement.removeAttribute('data-theme');
    else document.documentElement.setAttribute('data-theme', theme);
  }, [theme]);
  const next: Record<ThemeName, ThemeName> = { system: 'light', light: 'dark', dark: 'system' };
  return (
    <button
      className="quiet"
      title="Light, dark, or as the system"
      onClick={() => {
        const chosen = next[theme];
        window.localStorage.setItem('theme', chosen);
        setTheme(chosen);
      }}
    >
      {THEMES[theme]}
    </button>
  );
}
