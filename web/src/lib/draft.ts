'use client';
/** The building of a draft while it is edited. What was typed and not saved is kept in the browser until it is saved or dropped. */
import type { Building } from '@groundward/engine/building/definition';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { ApiProblem, api, type Revision } from './api';
import { changed, type Change } from './edit';

type Kept = { readonly version: number; readonly document: unknown };

export type Draft = {
  readonly document: unknown;
  /** Counts how often the whole document was replaced. */
  readonly round: number;
  readonly dirty: boolean;
  readonly busy: boolean;
  readonly error: unknown;
  readonly message: string;
  readonly change: (changes: readonly Change[]) => void;
  readonly replace: (document: unknown, message?: string) => void;
  readonly fail: (error: unknown) => void;
  readonly drop: () => void;
  readonly save: () => Promise<void>;
  /** After somebody else saved: the next save goes over theirs, or theirs is taken and what was typed is dropped. */
  readonly overrule: () => void;
  readonly yieldToTheirs: () => Promise<void>;
};

export function useDraft(projectId: string, revision: Revision, saved: Building): Draft {
  const client = useQueryClient();
  const [document, setDocument] = useState<unknown>(saved);
  const [version, setVersion] = useState(revision.version);
  const [round, setRound] = useState(0);
  const [error, setError] = useState<unknown>(null);
  const [busy, setBusy] = useState(false);
  const [message, setMessage] = useState('');
  const locked = revision.state === 'issued';
  const store = `draft ${revision.id}`;
  useEffect(() => {
    const before = keptIn(`draft ${revision.id}`);
    if (before === null || locked) return;
    setDocument(before.document);
    setVersion(before.version);
    setRound((now) => now + 1);
    setMessage('Unsaved changes from before were brought back.');
  }, [revision.id, locked]);
  const edit = (next: unknown, said: string): void => {
    setDocument(next);
    setMessage(said);
    window.localStorage.setItem(store, JSON.stringify({ version, document: next } satisfies Kept));
  };
  const drop = (): void => {
    window.localStorage.removeItem(store);
    setDocument(saved);
    setVersion(revision.version);
    setRound((now) => now + 1);
    setError(null);
    setMessage('');
  };
  const refresh = async (): Promise<void> => {
    await client.invalidateQueries({ queryKey: ['revision', revision.id] });
    await client.invalidateQueries({ queryKey: ['revisions', projectId] });
  };
  return {
    document,
    round,
    dirty: document !== saved,
    busy,
    error,
    message,
    change: (changes) => edit(changed(document, changes), ''),
    replace: (next, said = '') => {
      edit(next, said);
      setRound((now) => now + 1);
    },
    fail: setError,
    drop,
    save: async () => {
      setBusy(true);
      setError(null);
      setMessage('');
      try {
        await api.save(projectId, revision.id, JSON.stringify(document), version);
        window.localStorage.removeItem(store);
        await refresh();
      } catch (failure) {
        setError(failure);
      }
      setBusy(false);
    },
    overrule: () => {
      const theirs = currentOf(error);
      if (theirs !== undefined) setVersion(theirs.version);
      setError(null);
      setMessage('The next save goes over theirs.');
    },
    yieldToTheirs: async () => {
      drop();
      await refresh();
    },
  };
}

function keptIn(store: string): Kept | null {
  const text = window.localStorage.getItem(store);
  return text === null ? null : (JSON.parse(text) as Kept);
}

/** The revision as somebody else saved it, where that is why a save was refused. */
export function currentOf(error: unknown): Revision | undefined {
  if (!(error instanceof ApiProblem) || error.status !== 412) return undefined;
  return (error.current as { revision?: Revision } | undefined)?.revision;
}
