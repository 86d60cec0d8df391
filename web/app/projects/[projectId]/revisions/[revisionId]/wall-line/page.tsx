'use client';
import type { Building, WallLine } from '@groundward/engine/building/definition';
import type { Analysis, Quantity, Sense } from '@groundward/engine/path/result';
import Link from 'next/link';
import { ElevationDrawing } from '@/drawings/elevation';
import { useWidth } from '@/drawings/use-width';
import { casesOf, levelName, levelsAscending, type DemandIndex } from '@/lib/demands';
import { useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
import { Figure } from '@/parts/figure';
import { Pending } from '@/parts/problem';
import { CaseSense, Select } from '@/parts/select';

export default function WallLinePage() {
  const { projectId, revisionId, building, analysis, index, error } = useRevision();
  if (building === undefined || analysis === undefined || index === undefined)
    return <Pending error={error} what="the analysis" />;
  return (
    <WallLineView
      building={building}
      analysis={analysis}
      index={index}
      root={`/projects/${projectId}/revisions/${revisionId}`}
    />
  );
}

function WallLineView({
  building,
  analysis,
  index,
  root,
}: {
  readonly building: Building;
  readonly analysis: Analysis;
  readonly index: DemandIndex;
  readonly root: string;
}) {
  const cases = casesOf(analysis);
  const [lineId, setLine] = useQueryState('line', building.wallLines[0]?.id ?? '');
  const line = building.wallLines.find((candidate) => candidate.id === lineId) ?? building.wallLines[0];
  const loaded =
    cases.find((id) =>
      analysis.demands.some(
        (row) =>
          row.kind === 'wall-line' &&
          row.quantity === 'shear' &&
          row.case === id &&
          row.member.startsWith(`${lineId}/`),
      ),
    ) ?? '';
  const [caseId, setCase] = useQueryState('case', loaded);
  const [senseText, setSense] = useQueryState('sense', '1');
  const sense: Sense = senseText === '-1' ? -1 : 1;
  const [ref, width] = useWidth<HTMLDivElement>();
  if (line === undefined) return <p>The building has no wall line.</p>;
  const openPosts = new Set(
    analysis.findings.filter((finding) => finding.code === 'post-on-nothing').map((finding) => finding.member),
  );
  const findings = analysis.findings.filter(
    (finding) => finding.member === line.id || finding.member.startsWith(`${line.id}/`),
  );
  return (
    <>
      <div className="bar">
        <Select
          label="Wall line"
          value={line.id}
          options={building.wallLines.map((each) => ({ value: each.id, name: each.name ?? each.id }))}
          onChange={setLine}
        />
        <CaseSense cases={cases} caseId={caseId} sense={sense} onCase={setCase} onSense={setSense} />
      </div>
      <div className="split">
        <div className="wide" ref={ref}>
          {width > 0 && (
            <ElevationDrawing view={{ building, line, forces: { index, caseId, sense }, openPosts }} width={width} />
          )}
          <ul className="legend">
            <li style={{ color: 'var(--force)' }}>→ what the diaphragm gives at the level; in the pier its shear</li>
            <li style={{ color: 'var(--tension)' }}>↑ end post in tension at the foot</li>
            <li style={{ color: 'var(--compression)' }}>↓ end post in compression</li>
            <li style={{ color: 'var(--alarm)' }}>✕ end post that stands on nothing</li>
            <li>end forces are those of the case alone, without gravity</li>
          </ul>
        </div>
        <div className="stack wide">
          <StoreyTable building={building} index={index} line={line} caseId={caseId} sense={sense} root={root} />
          <PierTable building={building} analysis={analysis} index={index} line={line} caseId={caseId} sense={sense} />
          {findings.length > 0 && (
            <section className="panel">
              <h2>Findings on this line</h2>
              {findings.map((finding, i) => (
                <p key={i}>
                  <span className={`tag ${finding.severity}`}>{finding.severity}</span> {finding.sentence}
                </p>
              ))}
            </section>
          )}
        </div>
      </div>
    </>
  );
}

type At = {
  readonly building: Building;
  readonly index: DemandIndex;
  readonly line: WallLine;
  readonly caseId: string;
  readonly sense: Sense;
};

function StoreyTable({ building, index, line, caseId, sense, root }: At & { readonly root: string }) {
  const levels = levelsAscending(building).slice(1).reverse();
  return (
    <section className="panel">
      <h2>From above, from the level, and on</h2>
      <div className="scroll">
        <table>
          <thead>
            <tr>
              <th>Storey under</th>
              <th className="n">From above</th>
              <th className="n">Reaction</th>
              <th className="n">Shear</th>
              <th className="n">Overturning</th>
              <th>Goes to</th>
            </tr>
          </thead>
          <tbody>
            {levels.map((level, i) => {
              if (!line.storeys.some((storey) => storey.under === level.id)) return null;
              const of = (quantity: Quantity) => index.of(`${line.id}/${level.id}`, quantity, caseId, sense);
              const above = levels[i - 1];
              const below = levels[i + 1];
              const goesOn = below === undefined || line.storeys.some((storey) => storey.under === below.id);
              return (
                <tr key={level.id}>
                  <td>{levelName(building, level.id)}</td>
                  <td className="n">
                    <Figure
                      demand={
                        above === undefined ? undefined : index.of(`${line.id}/${above.id}`, 'shear', caseId, sense)
                      }
                    />
                  </td>
                  <td className="n">
                    <Figure demand={of('reaction')} />
                  </td>
                  <td className="n">
                    <Figure demand={of('shear')} />
                  </td>
                  <td className="n">
                    <Figure demand={of('overturning-moment')} />
                  </td>
                  <td>
                    <Link
                      href={`${root}/path?member=${encodeURIComponent(`${line.id}/${level.id}`)}&case=${encodeURIComponent(caseId)}`}
                    >
                      {below === undefined
                        ? 'foundation'
                        : goesOn
                          ? 'the same line'
                          : `transfer at ${levelName(building, below.id)}`}
                    </Link>
                  </td>
                </tr>
              );
            })}
          </tbody>
        </table>
      </div>
    </section>
  );
}

function PierTable({ building, analysis, index, line, caseId, sense }: At & { readonly analysis: Analysis }) {
  const levels = levelsAscending(building).slice(1).reverse();
  const combinations = [
    ...new Set(
      analysis.demands
        .filter((row) => row.kind === 'pier' && row.case === caseId && row.combination !== undefined)
        .map((row) => row.combination ?? ''),
    ),
  ];
  const [combination, setCombination] = useQueryState('combination', '');
  const chosen = combinations.includes(combination) ? combination : undefined;
  return (
    <section className="panel">
      <h2>Piers</h2>
      {combinations.length > 0 && (
        <div className="bar">
          <Select
            label="End forces of"
            value={chosen ?? ''}
            options={[{ value: '', name: 'the case alone' }, ...combinations.map((value) => ({ value, name: value }))]}
            onChange={setCombination}
          />
        </div>
      )}
      <div className="scroll">
        <table>
          <thead>
            <tr>
              <th>Pier</th>
              <th className="n">Shear</th>
              <th className="n">Unit shear</th>
              <th className="n">End tension</th>
              <th className="n">compression</th>
            </tr>
          </thead>
          <tbody>
            {levels.flatMap((level) =>
              (line.storeys.find((storey) => storey.under === level.id)?.piers ?? []).map((pier) => {
                const key = `${line.id}/${level.id}/${pier.id}`;
                return (
                  <tr key={key}>
                    <td>{`${pier.id}, under ${levelName(building, level.id)}`}</td>
                    <td className="n">
                      <Figure demand={index.of(key, 'shear', caseId, sense)} />
                    </td>
                    <td className="n">
                      <Figure demand={index.of(key, 'unit-shear', caseId, sense)} />
                    </td>
                    <td className="n">
                      <Figure demand={index.of(key, 'end-tension', caseId, sense, chosen)} />
                    </td>
                    <td className="n">
                      <Figure demand={index.of(key, 'end-compression', caseId, sense, chosen)} />
                    </td>
                  </tr>
                );
              }),
            )}
          </tbody>
        </table>
      </div>
    </section>
  );
}
