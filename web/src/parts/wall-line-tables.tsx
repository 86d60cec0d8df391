'use client';
import type { WallLine } from '@groundward/engine/building/definition';
import type { Quantity } from '@groundward/engine/path/result';
import Link from 'next/link';
import { levelName, levelsAscending, type Facts, type Loading } from '@/lib/demands';
import { Figure } from './figure';
import { Table } from './table';

type At = Loading & { readonly facts: Facts; readonly line: WallLine };

/** What comes into every storey of the line, from above and from its level, and where it goes on. */
export function StoreyTable({ facts, line, caseId, sense, root }: At & { readonly root: string }) {
  const { building, index } = facts;
  const levels = levelsAscending(building).slice(1).reverse();
  return (
    <section className="panel">
      <h2>From above, from the level, and on</h2>
      <Table label="Forces into and out of every storey">
        <thead>
          <tr>
            <th>Under</th>
            <th className="n">From above</th>
            <th className="n">Reaction</th>
            <th className="n">Shear</th>
            <th className="n">Overturning</th>
            <th>Goes to</th>
          </tr>
        </thead>
        <tbody>
          {levels.map((level, i) => {
            if (!line.storeys.some(({ under }) => under === level.id)) return null;
            const of = (what: Quantity) => index.of(`${line.id}/${level.id}`, what, caseId, sense);
            const [above, below] = [levels[i - 1], levels[i + 1]];
            const arriving =
              above === undefined ? undefined : index.of(`${line.id}/${above.id}`, 'shear', caseId, sense);
            const href = `${root}/path?${new URLSearchParams({ member: `${line.id}/${level.id}`, case: caseId, sense: String(sense) })}`;
            return (
              <tr key={level.id}>
                <th scope="row">{levelName(building, level.id)}</th>
                {[arriving, of('reaction'), of('shear'), of('overturning-moment')].map((demand, j) => (
                  <td key={j} className="n">
                    <Figure demand={demand} />
                  </td>
                ))}
                <td>
                  <Link href={href} title="Its path, up and down">
                    {destination(facts, line, below?.id)}
                  </Link>
                </td>
              </tr>
            );
          })}
        </tbody>
      </Table>
    </section>
  );
}

function destination({ building }: Facts, line: WallLine, below: string | undefined): string {
  if (below === undefined) return 'foundation';
  return line.storeys.some(({ under }) => under === below) ? 'line below' : `transfer, ${levelName(building, below)}`;
}

const PIER = [
  ['shear', 'Shear', false],
  ['unit-shear', 'Unit shear', false],
  ['end-tension', '↑ Tension', true],
  ['end-compression', '↓ Compression', true],
] as const;

export function PierTable({
  facts,
  line,
  caseId,
  sense,
  combination,
}: At & { readonly combination: string | undefined }) {
  const { building, index } = facts;
  const levels = levelsAscending(building).slice(1).reverse();
  return (
    <section className="panel">
      <h2>{`Piers; end forces of ${combination ?? 'the case alone'}`}</h2>
      <Table label="Piers">
        <thead>
          <tr>
            <th>Under</th>
            <th>Pier</th>
            {PIER.map(([what, name]) => (
              <th key={what} className="n">
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {levels.flatMap((level) =>
            (line.storeys.find(({ under }) => under === level.id)?.piers ?? []).map((pier, p) => {
              const key = `${line.id}/${level.id}/${pier.id}`;
              return (
                <tr key={key} className={p === 0 ? 'part' : undefined}>
                  <th scope="row">{p === 0 ? levelName(building, level.id) : ''}</th>
                  <td title={key}>{pier.id}</td>
                  {PIER.map(([what, , factored]) => (
                    <td key={what} className="n">
                      <Figure demand={index.of(key, what, caseId, sense, factored ? combination : undefined)} />
                    </td>
                  ))}
                </tr>
              );
            }),
          )}
        </tbody>
      </Table>
    </section>
  );
}
