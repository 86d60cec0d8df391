'use client';
import type { Working } from '@groundward/engine/working/result';
import { useQuery } from '@tanstack/react-query';
import Link from 'next/link';
import { usePathname, useSearchParams } from 'next/navigation';
import { useEffect, useRef } from 'react';
import { api } from '@/lib/api';
import { senseSign, words } from '@/lib/format';
import { useQueryPatch } from '@/lib/query-state';
import { queryOf, sourceOf } from '@/lib/working';
import { ProblemView } from './problem';

/** The working that the address asks for, beside the page: its steps, each with formula, values, result and law. */
export function WorkingPanel({
  projectId,
  revisionId,
  version,
}: {
  readonly projectId: string;
  readonly revisionId: string;
  readonly version: number | undefined;
}) {
  const reference = useSearchParams().get('working') ?? '';
  const query = queryOf(reference);
  const patch = useQueryPatch();
  const heading = useRef<HTMLHeadingElement>(null);
  const opener = useRef<Element | null>(null);
  const working = useQuery({
    queryKey: ['working', revisionId, version, reference],
    queryFn: () => api.working(projectId, revisionId, query ?? {}),
    enabled: query !== undefined && version !== undefined,
    staleTime: Infinity,
  });
  const open = query !== undefined;
  useEffect(() => {
    if (!open) return;
    if (!(document.activeElement?.closest('.working') ?? false)) opener.current = document.activeElement;
    heading.current?.focus();
  }, [open, reference]);
  if (query === undefined) return null;
  const close = (): void => {
    patch({ working: '' });
    if (opener.current instanceof HTMLElement) opener.current.focus();
  };
  return (
    <aside
      className="working"
      aria-label="Working"
      onKeyDown={(event) => {
        if (event.key === 'Escape') close();
      }}
    >
      <header>
        <h2 ref={heading} tabIndex={-1}>
          {`Working: ${words(query['quantity'] ?? '')}`}
        </h2>
        <button type="button" onClick={close}>
          Close
        </button>
      </header>
      <p className="note">
        {`${query['member'] ?? ''}, case ${query['case'] ?? ''} ${senseSign(Number(query['sense']))}, ${query['combination'] ?? 'unfactored'}`}
      </p>
      <ProblemView error={working.error} />
      {working.isPending && <p role="status">Working it out …</p>}
      {working.data !== undefined && <Steps working={working.data} />}
    </aside>
  );
}

function Steps({ working }: { readonly working: Working }) {
  const symbols = working.steps.map(({ symbol }) => symbol);
  return (
    <>
      <ol className="steps">
        {working.steps.map((step, i) => (
          <li key={step.symbol} id={`step-${i + 1}`}>
            {step.what !== undefined && <p>{step.what}</p>}
            <p className="formula">
              <Symbols text={step.formula} /> = <strong>{shownWith(step.shown, step.unit)}</strong>
            </p>
            {step.clause !== undefined && <p className="clause">{step.clause}</p>}
            {step.values.length > 0 && (
              <table>
                <tbody>
                  {step.values.map((value) => (
                    <tr key={value.symbol}>
                      <th scope="row">
                        <Symbols text={value.symbol} />
                      </th>
                      <td className="n">{shownWith(value.shown, value.unit)}</td>
                      <td>
                        <From from={value.from} earlier={symbols.slice(0, i)} />
                        {value.what !== undefined && <span className="note">{` ${value.what}`}</span>}
                      </td>
                    </tr>
                  ))}
                </tbody>
              </table>
            )}
          </li>
        ))}
      </ol>
      <p className="note">
        Results have six significant figures; values have as many or more: as many as their step needs to give its
        printed result.
      </p>
    </>
  );
}

/** An earlier step, another demand with its own working, or a place in the building file. */
function From({ from, earlier }: { readonly from: string | undefined; readonly earlier: readonly string[] }) {
  const pathname = usePathname();
  const search = useSearchParams();
  if (from === undefined) return null;
  const source = sourceOf(from, earlier);
  if (source.kind === 'step') return <a href={`#step-${source.index + 1}`}>{`step ${source.index + 1}`}</a>;
  if (source.kind === 'demand') {
    const next = new URLSearchParams(search);
    next.set('working', source.reference);
    return (
      <Link href={`${pathname}?${next}`} scroll={false}>
        {source.reference}
      </Link>
    );
  }
  return (
    <>
      {source.kind === 'default' && 'default of '}
      <code>{source.path}</code>
    </>
  );
}

/** Symbols with what follows the first low line set low. */
function Symbols({ text }: { readonly text: string }) {
  return text.split(/([\p{L}][\p{L}\p{N}_′]*)/u).map((part, i) => {
    const cut = part.indexOf('_');
    if (i % 2 === 0 || cut < 0) return part;
    return (
      <span key={i}>
        {part.slice(0, cut)}
        <sub>{part.slice(cut + 1).replaceAll('_', ',')}</sub>
      </span>
    );
  });
}

function shownWith(shown: string, unit: string): string {
  const number = shown.replaceAll('-', '−');
  return unit === '1' ? number : `${number} ${unit}`;
}
