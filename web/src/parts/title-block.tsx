import Link from 'next/link';
import type { ReactNode } from 'react';
import type { Revision } from '@/lib/api';
import { scientific, shortHash, when } from '@/lib/format';

/** The title block of a revision's sheet: what it is, in which state, and how far it can be relied on. */
export function TitleBlock({
  projectId,
  root,
  revision,
  building,
}: {
  readonly projectId: string;
  readonly root: string;
  readonly revision: Revision | undefined;
  readonly building: string | undefined;
}) {
  const state = revision?.state;
  return (
    <dl className="block">
      <Cell name="Building" grow>
        <Link href={`/projects/${projectId}`}>{building ?? '…'}</Link>
      </Cell>
      <Cell name="Revision" grow>
        {revision === undefined ? (
          '…'
        ) : (
          <>
            <b className="number">{revision.number}</b> {revision.name}
          </>
        )}
      </Cell>
      <Cell name="State">{state === undefined ? '…' : <StateTag state={state} />}</Cell>
      <Cell name={state === 'issued' ? 'Issued' : 'Saved'} narrow>
        {revision === undefined ? '…' : when(revision.issuedAt ?? revision.updatedAt)}
      </Cell>
      <Cell name="Hash" narrow>
        <span className="mono" title={revision?.hash}>
          {revision === undefined ? '…' : shortHash(revision.hash)}
        </span>
      </Cell>
      <Cell name="Findings">
        <Link href={`${root}/findings`}>
          {revision === undefined ? '…' : <FindingCounts findings={revision.summary.findings} />}
        </Link>
      </Cell>
      <Cell name="Largest residual">
        <Link href={`${root}/findings#certificate`} title="Certificate: equilibrium, relative to the forces involved">
          {revision === undefined ? '…' : scientific(revision.summary.worstResidual)}
        </Link>
      </Cell>
    </dl>
  );
}

function Cell({
  name,
  grow = false,
  narrow = false,
  children,
}: {
  readonly name: string;
  /** Takes what room is left. */
  readonly grow?: boolean;
  /** Left out on a narrow screen. */
  readonly narrow?: boolean;
  readonly children: ReactNode;
}) {
  return (
    <div className={[grow ? 'grow' : '', narrow ? 'hide-narrow' : ''].join(' ').trim() || undefined}>
      <dt>{name}</dt>
      <dd>{children}</dd>
    </div>
  );
}

export function StateTag({ state }: { readonly state: Revision['state'] }) {
  return <span className={`tag ${state}`}>{state === 'issued' ? '■ issued' : '□ draft'}</span>;
}

const SIGNS = [
  ['openEnd', '✕', 'open ends', 'open-end'],
  ['warning', '△', 'warnings', 'warning'],
  ['note', '○', 'notes', 'note'],
] as const;

/** How many findings of each severity, by sign and number; the words are for whoever listens or points. */
export function FindingCounts({ findings }: { readonly findings: Revision['summary']['findings'] }) {
  return (
    <span className="counts">
      {SIGNS.map(([key, sign, name, severity]) => (
        <span key={key} className={findings[key] === 0 ? 'none' : severity} title={`${findings[key]} ${name}`}>
          <span aria-hidden>{sign}</span>
          {findings[key]}
          <span className="hidden">{` ${name} `}</span>
        </span>
      ))}
    </span>
  );
}

/** The sign of a severity. */
export function severitySign(severity: string): string {
  return SIGNS.find(([, , , name]) => name === severity)?.[1] ?? '';
}
