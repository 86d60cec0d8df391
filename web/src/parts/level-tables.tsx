'use client';
import type { Analysis, Demand, DiaphragmDiagram, Quantity } from '@groundward/engine/path/result';
import { CollectorSpark, largestAxial, type CollectorView } from '@/drawings/collector';
import { ORDINATES } from '@/drawings/span-diagrams';
import type { DemandIndex, Facts, Loading } from '@/lib/demands';
import { dimension, figure } from '@/lib/format';
import { breaksOf } from '@/lib/polynomial';
import { Figure } from './figure';
import { Table } from './table';

type At = Loading & { readonly level: string };

const LEVEL: readonly (readonly [Quantity, string])[] = [
  ['force', 'Storey force'],
  ['diaphragm-force', 'Diaphragm design force'],
  ['storey-shear', 'Storey shear'],
  ['overturning-moment', 'Overturning at the storey’s foot'],
  ['torsion', 'Torsion about the centre of rigidity'],
  ['torsional-ratio', 'Largest over average edge drift'],
  ['torsional-amplification', 'Amplification of accidental torsion'],
  ['drift', 'Largest edge displacement'],
  ['deflection', 'Largest in-plane deflection'],
  ['deflection-ratio', 'Deflection over average drift of the walls'],
];

export function LevelFigures({ index, level, caseId, sense }: At & { readonly index: DemandIndex }) {
  const rows = LEVEL.flatMap(([what, name]) => {
    const demand = index.of(level, what, caseId, sense);
    return demand === undefined ? [] : [{ name, demand }];
  });
  return (
    <section className="panel">
      <h2>Level</h2>
      <Table label="Forces of the level">
        <tbody>
          {rows.map(({ name, demand }) => (
            <tr key={name}>
              <th scope="row">{name}</th>
              <td className="n">
                <Figure demand={demand} />
              </td>
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}

const SPAN = ['shear', 'unit-shear', 'net-unit-shear', 'moment', 'chord-force'] as const;
const TRANSFER = ['shear', 'net-unit-shear', 'chord-force'] as const;
const STRUT = ['axial-tension', 'axial-compression'] as const;
const OPENING = ['secondary-moment', 'chord-force', 'corner-force'] as const;

const OF_DIAPHRAGM: ReadonlySet<Demand['kind']> = new Set(['diaphragm-span', 'opening', 'transfer-diaphragm', 'strut']);

export function SpanTable({ analysis, level, caseId, sense }: At & { readonly analysis: Analysis }) {
  const members = new Map<string, Map<Quantity, Demand>>();
  for (const row of analysis.demands) {
    if (!OF_DIAPHRAGM.has(row.kind) || row.case !== caseId || row.sense !== sense) continue;
    if (!row.member.startsWith(`${level}/`)) continue;
    const known = members.get(row.member) ?? new Map<Quantity, Demand>();
    known.set(row.quantity, row);
    members.set(row.member, known);
  }
  const netShears = [...members.values()].some((rows) => rows.get('net-unit-shear')?.kind === 'diaphragm-span');
  return (
    <section className="panel">
      <h2>Diaphragm</h2>
      <Quantities
        label="Spans between wall lines"
        heads={['Span', 'Shear V', 'Unit shear', ...(netShears ? ['Net unit shear'] : []), 'Moment M', 'Chord']}
        quantities={SPAN.filter((what) => what !== 'net-unit-shear' || netShears)}
        members={[...members].filter(([, rows]) => rows.has('unit-shear'))}
      />
      <Quantities
        label="Openings"
        heads={['Opening', 'Secondary M', 'Chord', 'Corner tie']}
        quantities={OPENING}
        members={[...members].filter(([, rows]) => rows.has('secondary-moment'))}
      />
      <Quantities
        label="Transfer diaphragms at steps"
        heads={['At', 'Transfer shear', 'Net unit shear', 'Chord']}
        quantities={TRANSFER}
        members={[...members].filter(([, rows]) => rows.get('net-unit-shear')?.kind === 'transfer-diaphragm')}
      />
      <Quantities
        label="Struts at steps"
        heads={['At', 'Tension +', 'Compression −']}
        quantities={STRUT}
        members={[...members].filter(([, rows]) => rows.get('axial-tension')?.kind === 'strut')}
      />
    </section>
  );
}

function Quantities({
  label,
  heads,
  quantities,
  members,
}: {
  readonly label: string;
  readonly heads: readonly string[];
  readonly quantities: readonly Quantity[];
  readonly members: readonly (readonly [string, ReadonlyMap<Quantity, Demand>])[];
}) {
  if (members.length === 0) return null;
  return (
    <Table label={label}>
      <thead>
        <tr>
          {heads.map((head, i) => (
            <th key={head} className={i === 0 ? undefined : 'n'}>
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {members.map(([member, rows]) => (
          <tr key={member}>
            <th scope="row" title={member}>
              {member.split('/').slice(2).join('/')}
            </th>
            {quantities.map((what) => (
              <td key={what} className="n">
                <Figure demand={rows.get(what)} />
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

export function CollectorTable({
  facts,
  collectors,
  level,
  caseId,
  sense,
  shown,
  onPick,
}: At & {
  readonly facts: Facts;
  readonly collectors: readonly CollectorView[];
  readonly shown: string;
  readonly onPick: (line: string) => void;
}) {
  const { building, index } = facts;
  const most = largestAxial(collectors);
  const rows = building.wallLines.flatMap((line) => {
    const tension = index.of(`${level}/${line.id}`, 'axial-tension', caseId, sense);
    const compression = index.of(`${level}/${line.id}`, 'axial-compression', caseId, sense);
    const reaction = index.of(`${line.id}/${level}`, 'reaction', caseId, sense);
    const design = (['design-tension', 'design-compression'] as const).map((what) =>
      index.of(`${level}/${line.id}`, what, caseId, sense),
    );
    return tension === undefined && reaction === undefined ? [] : [{ line, tension, compression, reaction, design }];
  });
  const designed = rows.some(({ design }) => design.some((demand) => demand !== undefined));
  return (
    <section className="panel">
      <h2>Wall lines and their collectors</h2>
      <Table label="Wall lines and their collectors">
        <thead>
          <tr>
            <th>Line</th>
            <th className="n">Reaction</th>
            <th>Axial force along it</th>
            <th className="n">Tension +</th>
            <th className="n">Compression −</th>
            {designed && <th className="n">Design +</th>}
            {designed && <th className="n">Design −</th>}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ line, tension, compression, reaction, design }) => {
            const collector = collectors.find((candidate) => candidate.line.id === line.id);
            return (
              <tr key={line.id} className={line.id === shown ? 'on' : undefined}>
                <th scope="row">
                  <button
                    className="quiet"
                    aria-pressed={line.id === shown}
                    onClick={() => onPick(line.id)}
                    title={line.name}
                  >
                    {line.id}
                  </button>
                </th>
                <td className="n">
                  <Figure demand={reaction} />
                </td>
                <td className="spark">
                  {collector !== undefined && <CollectorSpark collector={collector} most={most} />}
                </td>
                <td className="n">
                  <Figure demand={tension} />
                </td>
                <td className="n">
                  <Figure demand={compression} />
                </td>
                {designed &&
                  design.map((demand, i) => (
                    <td className="n" key={i}>
                      <Figure demand={demand} />
                    </td>
                  ))}
              </tr>
            );
          })}
        </tbody>
      </Table>
    </section>
  );
}

/** The numbers behind the diagrams: both sides of every break. */
export function BreakTable({
  diagrams,
  sense,
  units,
}: {
  readonly diagrams: readonly DiaphragmDiagram[];
  readonly sense: Loading['sense'];
  readonly units: { readonly force: string; readonly length: string };
}) {
  const rows = diagrams.flatMap((diagram) => breaksOf(diagram, sense));
  return (
    <details className="panel">
      <summary>The diagrams as a table: both sides of every break</summary>
      <Table label="Values at every break of the diagrams">
        <thead>
          <tr>
            <th className="n">{`s [${units.length}]`}</th>
            {ORDINATES.map(({ key, name, unit }) => (
              <th key={key} className="n">{`${name} [${unit(units.force, units.length)}]`}</th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, i) => (
            <tr key={i}>
              <td className="n">{dimension(row.s)}</td>
              {ORDINATES.map(({ key }) => (
                <td key={key} className="n">
                  {figure(row[key])}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </Table>
    </details>
  );
}
