'use client';
import type { Level, WallLine } from '@groundward/engine/building/definition';
import type { PathEdge, Sense } from '@groundward/engine/path/result';
import type { Part } from '@groundward/engine/path/trace-result';
import { levelName, levelsAscending, type Facts, type Loading } from '@/lib/demands';
import { percent, quantity, words } from '@/lib/format';
import { Figure } from './figure';
import { Table } from './table';

/** Parts that add up to the whole; a part may be negative where torsion takes away. */
export function Parts({
  title,
  parts,
  sense,
  unit,
  onPick,
}: {
  readonly title: string;
  readonly parts: readonly Part[];
  readonly sense: Sense;
  readonly unit: string;
  readonly onPick: (member: string) => void;
}) {
  const total = parts.reduce((sum, part) => sum + part.force, 0);
  const share = parts.reduce((sum, part) => sum + part.share, 0);
  return (
    <section className="panel">
      <h2>{title}</h2>
      <Table label={title}>
        <tbody>
          {parts.map((part) => (
            <tr key={part.member}>
              <th scope="row">
                <button className="quiet" onClick={() => onPick(part.member)}>
                  {part.member}
                </button>
              </th>
              <td className="n">{quantity(part.force * sense, unit)}</td>
              <td className="n">{percent(part.share)}</td>
              <td style={{ width: 110 }} aria-hidden>
                <svg width={100} height={8}>
                  <rect
                    x={0.5}
                    y={1}
                    width={Math.min(99, Math.abs(part.share) * 99)}
                    height={6}
                    className={part.share < 0 ? 'flow against' : 'flow shown'}
                  />
                </svg>
              </td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr className="strong">
            <th scope="row">Sum</th>
            <td className="n">{quantity(total * sense, unit)}</td>
            <td className="n">{percent(share)}</td>
            <td />
          </tr>
        </tfoot>
      </Table>
    </section>
  );
}

/** The drawing as a table: the shear of every wall line in every storey. */
export function ShearTable({
  facts,
  lines,
  caseId,
  sense,
  onPick,
}: Loading & {
  readonly facts: Facts;
  readonly lines: readonly WallLine[];
  readonly onPick: (member: string) => void;
}) {
  const levels = levelsAscending(facts.building).slice(1).reverse();
  return (
    <section className="panel">
      <h2>Shear of every wall line, by the storey under</h2>
      <Table label="Shear of every wall line in every storey">
        <thead>
          <tr>
            <th>Line</th>
            {levels.map((level) => (
              <th key={level.id} className="n">
                {levelName(facts.building, level.id)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {lines.map((line) => (
            <tr key={line.id}>
              <th scope="row">
                <button
                  className="quiet"
                  title="Follow it in its lowest storey"
                  onClick={() => onPick(`${line.id}/${lowestOf(line, levels)}`)}
                >
                  {line.id}
                </button>
              </th>
              {levels.map((level) => (
                <td key={level.id} className="n">
                  <Figure demand={facts.index.of(`${line.id}/${level.id}`, 'shear', caseId, sense)} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}

function lowestOf(line: WallLine, levels: readonly Level[]): string {
  return levels.findLast(({ id }) => line.storeys.some(({ under }) => under === id))?.id ?? '';
}

/** The members next to one, from which it gets its force and to which it gives it. */
export function Neighbours({
  facts,
  member,
  caseId,
  sense,
  onPick,
}: Loading & { readonly facts: Facts; readonly member: string; readonly onPick: (member: string) => void }) {
  const { path } = facts.analysis;
  const nodes = new Map(path.nodes.map((node) => [node.id, node]));
  const of = (end: 'from' | 'to', far: 'from' | 'to'): { readonly edge: PathEdge; readonly at: string }[] =>
    path.edges
      .filter((edge) => edge.case === caseId && nodes.get(edge[end])?.member === member)
      .map((edge) => ({ edge, at: edge[far] }));
  const rows = [
    ...of('to', 'from').map((row) => ({ ...row, word: 'from' })),
    ...of('from', 'to').map((row) => ({ ...row, word: 'to' })),
  ];
  return (
    <section className="panel">
      <h2>Next members</h2>
      <Table label="Next members">
        <tbody>
          {rows.map(({ edge, at, word }) => {
            const node = nodes.get(at);
            return (
              <tr key={`${edge.from} ${edge.to} ${edge.acts}`}>
                <td>{word}</td>
                <td>{words(node?.kind ?? '')}</td>
                <th scope="row">
                  <button className="quiet" onClick={() => onPick(node?.member ?? at)}>
                    {node?.member ?? at}
                  </button>
                </th>
                <td className="n">{quantity(edge.force * sense, facts.building.units.force)}</td>
                <td>{edge.acts === 'vertical' ? 'down' : 'sideways'}</td>
              </tr>
            );
          })}
        </tbody>
      </Table>
    </section>
  );
}
