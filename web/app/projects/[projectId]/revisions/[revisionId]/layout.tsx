'use client';
import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { Suspense, type ReactNode } from 'react';
import { useRevision } from '@/lib/revision-data';
import { shortHash, when } from '@/lib/format';

const TABS = [
  ['building', 'Building'],
  ['level', 'Levels'],
  ['wall-line', 'Wall lines'],
  ['path', 'Path'],
  ['foundation', 'Foundation'],
  ['findings', 'Findings'],
] as const;

export default function RevisionLayout({ children }: { readonly children: ReactNode }) {
  const { projectId, revisionId, revision, building } = useRevision();
  const pathname = usePathname();
  const root = `/projects/${projectId}/revisions/${revisionId}`;
  const findings = revision?.summary.findings;
  return (
    <>
      <dl className="block" style={{ margin: 0 }}>
        <div>
          <dt>Building</dt>
          <dd>
            <Link href={`/projects/${projectId}`}>{building?.name ?? '…'}</Link>
          </dd>
        </div>
        <div>
          <dt>Revision</dt>
          <dd>
            {revision === undefined ? '…' : `${revision.number} ${revision.name} `}
            {revision !== undefined && <span className={`tag ${revision.state}`}>{revision.state}</span>}
          </dd>
        </div>
        <div className="hide-narrow">
          <dt>{revision?.state === 'issued' ? 'Issued' : 'Saved'}</dt>
          <dd>{revision === undefined ? '…' : when(revision.issuedAt ?? revision.updatedAt)}</dd>
        </div>
        <div className="hide-narrow">
          <dt>Hash</dt>
          <dd className="mono" title={revision?.hash}>
            {revision === undefined ? '…' : shortHash(revision.hash)}
          </dd>
        </div>
        <div>
          <dt>Findings</dt>
          <dd>
            <Link href={`${root}/findings`}>
              {findings === undefined
                ? '…'
                : `${findings.openEnd} open ends, ${findings.warning} warnings, ${findings.note} notes`}
            </Link>
          </dd>
        </div>
        <div>
          <dt>Certificate: largest residual</dt>
          <dd>
            <Link href={`${root}/findings#certificate`}>
              {revision === undefined ? '…' : revision.summary.worstResidual.toExponential(1)}
            </Link>
          </dd>
        </div>
      </dl>
      <nav className="tabs" aria-label="Views of the revision">
        {TABS.map(([path, name]) => (
          <Link key={path} href={`${root}/${path}`} aria-current={pathname.endsWith(`/${path}`) ? 'page' : undefined}>
            {name}
          </Link>
        ))}
        <Link href={`/projects/${projectId}/compare?after=${revisionId}`}>Compare</Link>
      </nav>
      <main>
        <Suspense>{children}</Suspense>
      </main>
    </>
  );
}
