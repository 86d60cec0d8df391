'use client';
import type { Building } from '@groundward/engine/building/definition';
import type { Analysis, Sense } from '@groundward/engine/path/result';
import type { Part } from '@groundward/engine/path/trace-result';
import { useQuery } from '@tanstack/react-query';
import { DescentDrawing } from '@/drawings/descent';
import { api } from '@/lib/api';
import { casesOf, type DemandIndex } from '@/lib/demands';
import { percent, quantity } from '@/lib/format';
import { useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
import { Pending } from '@/parts/problem';
import { CaseSense, Select } from '@/parts/select';

export default function PathPage() {
  const { projectId, revisionId, building, analysis, index, error } = useRevision();
  if (building === undefined || analysis === undefined || index === undefined)
    return <Pending error={error} what="the analysis" />;
  return (
    <PathView projectId={projectId} revisionId={revisionId} building={building} analysis={analysis} index={index} />
  );
}

function PathView({
  projectId,
  revisionId,
  building,
  analysis,
  index,
}: {
  readonly projectId: string;
  readonly revisionId: string;
  readonly building: Building;
  readonly analysis: Analysis;
  readonly index: DemandIndex;
}) {
  const cases = casesOf(analysis);
  const [caseId, setCase] = useQueryState('case', cases[0] ?? '');
  const [senseText, setSense] = useQueryState('sense', '1');
  const sense: Sense = senseText === '-1' ? -1 : 1;
  const [member, setMember] = useQueryState('member', '');
  const members = analysis.path.nodes.map((node) => node.member);
  const trace = useQuery({
    queryKey: ['trace', revisionId, member, caseId],
    queryFn: () => api.trace(projectId, revisionId, member, caseId),
    enabled: member !== '',
  });
  const { force } = building.units;
  return (
    <>
      <div className="bar">
        <CaseSense cases={cases} caseId={caseId} sense={sense} onCase={setCase} onSense={setSense} />
        <Select
          label="Member, up and down from it"
          value={member}
          options={[
            { value: '', name: 'pick one here or in the drawing' },
            ...[...new Set(members)].sort().map((value) => ({ value, name: value })),
          ]}
          onChange={setMember}
        />
      </div>
      <div className="split">
        <div className="wide">
          <DescentDrawing view={{ building, index, caseId, sense, shown: member }} onPick={setMember} />
          <ul className="legend">
            <li>ribbons are as wide as the shear; dashed where it runs against the line’s axis</li>
            <li>solid bar: rigid diaphragm; dashed bar: flexible</li>
            <li>small figure: what the level’s diaphragm adds to the line</li>
          </ul>
        </div>
        <div className="stack wide">
          {member === '' ? (
            <p className="note">
              Pick a wall line in a storey, or a diaphragm’s bar, to see which masses feed it and at which supports its
              force ends.
            </p>
          ) : trace.data === undefined ? (
            <Pending error={trace.error} what={`the path of ${member}`} />
          ) : (
            <>
              <section className="panel">
                <h2>{member}</h2>
                <p>{`Carries ${quantity(trace.data.force * sense, force, 4)} under ${caseId}.`}</p>
              </section>
              <Parts title="Up: the masses that feed it" parts={trace.data.up} sense={sense} unit={force} />
              <Parts title="Down: the supports where it ends" parts={trace.data.down} sense={sense} unit={force} />
            </>
          )}
        </div>
      </div>
    </>
  );
}

/** Parts that add up to the whole; a part may be negative where torsion takes away. */
function Parts({
  title,
  parts,
  sense,
  unit,
}: {
  readonly title: string;
  readonly parts: readonly Part[];
  readonly sense: Sense;
  readonly unit: string;
}) {
  const total = parts.reduce((sum, part) => sum + part.force, 0);
  const share = parts.reduce((sum, part) => sum + part.share, 0);
  return (
    <section className="panel">
      <h2>{title}</h2>
      <table>
        <tbody>
          {parts.map((part) => (
            <tr key={part.member}>
              <td>{part.member}</td>
              <td className="n">{quantity(part.force * sense, unit)}</td>
              <td className="n">{percent(part.share)}</td>
              <td style={{ width: 90 }} aria-hidden>
                <svg width={90} height={8}>
                  <rect
                    x={0}
                    y={1}
                    width={Math.min(90, Math.abs(part.share) * 90)}
                    height={6}
                    fill={part.share < 0 ? 'none' : 'var(--force)'}
                    stroke="var(--force)"
                  />
                </svg>
              </td>
            </tr>
          ))}
          <tr className="strong">
            <td>Sum</td>
            <td className="n">{quantity(total * sense, unit)}</td>
            <td className="n">{percent(share)}</td>
            <td />
          </tr>
        </tbody>
      </table>
    </section>
  );
}
