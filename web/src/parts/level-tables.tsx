'use client';
import type { Building } from '@groundward/engine/building/definition';
import type { Analysis, Demand, Quantity, Sense } from '@groundward/engine/path/result';
import type { DemandIndex } from '@/lib/demands';
import { Figure } from './figure';

type At = { readonly level: string; readonly caseId: string; readonly sense: Sense };

const LEVEL: readonly (readonly [Quantity, string])[] = [
  ['force', 'Storey force'],
  ['diaphragm-force', 'Diaphragm design force'],
  ['storey-shear', 'Storey shear'],
  ['overturning-moment', 'Overturning at the storey’s foot'],
  ['torsion', 'Torsion about the centre of rigidity'],
  ['torsional-ratio', 'Largest over average edge drift'],
  ['torsional-amplification', 'Amplification of the accidental torsion'],
  ['drift', 'Largest edge displacement in the storey'],
];

export function LevelFigures({ index, level, caseId, sense }: At & { readonly index: DemandIndex }) {
  const rows = LEVEL.flatMap(([quantity, name]) => {
    const demand = index.of(level, quantity, caseId, sense);
    return demand === undefined ? [] : [{ name, demand }];
  });
  return (
    <section className="panel">
      <h2>Level</h2>
      <table>
        <tbody>
          {rows.map(({ name, demand }) => (
            <tr key={name}>
              <td>{name}</td>
              <td className="n">
                <Figure demand={demand} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

export function SpanTable({ analysis, level, caseId, sense }: At & { readonly analysis: Analysis }) {
  const spans = new Map<string, Map<Quantity, Demand>>();
  for (const row of analysis.demands) {
    if ((row.kind !== 'diaphragm-span' && row.kind !== 'opening') || row.case !== caseId || row.sense !== sense)
      continue;
    if (!row.member.startsWith(`${level}/`)) continue;
    const known = spans.get(row.member) ?? new Map<Quantity, Demand>();
    known.set(row.quantity, row);
    spans.set(row.member, known);
  }
  const of = (member: string): string => member.split('/').slice(2).join('/');
  const diaphragms = [...spans].filter(([, rows]) => rows.has('unit-shear'));
  const openings = [...spans].filter(([, rows]) => rows.has('secondary-moment'));
  return (
    <section className="panel">
      <h2>Spans between wall lines</h2>
      <div className="scroll">
        <table>
          <thead>
            <tr>
              <th>Span</th>
              <th className="n">Shear</th>
              <th className="n">Unit shear</th>
              <th className="n">Moment</th>
              <th className="n">Chord</th>
            </tr>
          </thead>
          <tbody>
            {diaphragms.map(([member, rows]) => (
              <tr key={member}>
                <td title={member}>{of(member)}</td>
                {(['shear', 'unit-shear', 'moment', 'chord-force'] as const).map((quantity) => (
                  <td key={quantity} className="n">
                    <Figure demand={rows.get(quantity)} />
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {openings.length > 0 && (
        <div className="scroll" style={{ marginTop: 8 }}>
          <table>
            <thead>
              <tr>
                <th>Opening</th>
                <th className="n">Secondary moment</th>
                <th className="n">Chord</th>
                <th className="n">Corner tie</th>
              </tr>
            </thead>
            <tbody>
              {openings.map(([member, rows]) => (
                <tr key={member}>
                  <td title={member}>{of(member)}</td>
                  {(['secondary-moment', 'chord-force', 'corner-force'] as const).map((quantity) => (
                    <td key={quantity} className="n">
                      <Figure demand={rows.get(quantity)} />
                    </td>
                  ))}
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
    </section>
  );
}

export function CollectorTable({
  building,
  index,
  level,
  caseId,
  sense,
  shown,
  onPick,
}: At & {
  readonly building: Building;
  readonly index: DemandIndex;
  readonly shown: string;
  readonly onPick: (line: string) => void;
}) {
  const rows = building.wallLines.flatMap((line) => {
    const tension = index.of(`${level}/${line.id}`, 'axial-tension', caseId, sense);
    const compression = index.of(`${level}/${line.id}`, 'axial-compression', caseId, sense);
    const reaction = index.of(`${line.id}/${level}`, 'reaction', caseId, sense);
    return tension === undefined && reaction === undefined ? [] : [{ line, tension, compression, reaction }];
  });
  return (
    <section className="panel">
      <h2>Wall lines and their collectors</h2>
      <div className="scroll">
        <table>
          <thead>
            <tr>
              <th>Line</th>
              <th className="n">Reaction</th>
              <th className="n">Collector tension</th>
              <th className="n">compression</th>
            </tr>
          </thead>
          <tbody>
            {rows.map(({ line, tension, compression, reaction }) => (
              <tr key={line.id} className={line.id === shown ? 'on' : undefined}>
                <td>
                  <button className="quiet" onClick={() => onPick(line.id === shown ? '' : line.id)} title={line.name}>
                    {line.id}
                  </button>
                </td>
                <td className="n">
                  <Figure demand={reaction} />
                </td>
                <td className="n">
                  <Figure demand={tension} />
                </td>
                <td className="n">
                  <Figure demand={compression} />
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}
