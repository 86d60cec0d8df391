'use client';
import Link from 'next/link';
import { usePathname, useSearchParams } from 'next/navigation';
import { Suspense, type ReactNode } from 'react';
import { useRevision } from '@/lib/revision-data';
import { FactsOf } from '@/parts/facts';
import { TitleBlock } from '@/parts/title-block';
import { WorkingPanel } from '@/parts/working-panel';

const VIEWS = [
  ['building', 'Building'],
  ['level', 'Levels'],
  ['wall-line', 'Wall lines'],
  ['path', 'Path'],
  ['foundation', 'Foundation'],
  ['findings', 'Findings'],
] as const;

export default function RevisionLayout({ children }: { readonly children: ReactNode }) {
  const { projectId, revisionId, root, revision, building, facts } = useRevision();
  return (
    <FactsOf facts={facts}>
      <TitleBlock projectId={projectId} root={root} revision={revision} building={building?.name} />
      <Suspense>
        <Views root={root} compare={`/projects/${projectId}/compare?after=${revisionId}`} />
      </Suspense>
      <main>
        <Suspense>{children}</Suspense>
      </main>
      <Suspense>
        <WorkingPanel projectId={projectId} revisionId={revisionId} version={revision?.version} />
      </Suspense>
    </FactsOf>
  );
}

/** The views of a revision; the case and its sense go along from one to the next. */
function Views({ root, compare }: { readonly root: string; readonly compare: string }) {
  const pathname = usePathname();
  const search = useSearchParams();
  const kept = new URLSearchParams();
  for (const name of ['case', 'sense', 'level', 'line']) {
    const value = search.get(name);
    if (value !== null) kept.set(name, value);
  }
  const query = kept.size === 0 ? '' : `?${kept.toString()}`;
  return (
    <nav className="tabs" aria-label="Views of the revision">
      {VIEWS.map(([path, name]) => (
        <Link
          key={path}
          href={`${root}/${path}${query}`}
          aria-current={pathname.endsWith(`/${path}`) ? 'page' : undefined}
        >
          {name}
        </Link>
      ))}
      <Link href={compare}>Compare</Link>
    </nav>
  );
}
