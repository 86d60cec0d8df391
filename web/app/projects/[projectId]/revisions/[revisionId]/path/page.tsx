'use client';
import type { Sense } from '@groundward/engine/path/result';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { FlowDrawing } from '@/drawings/flow';
import { useWidth } from '@/drawings/use-width';
import { api } from '@/lib/api';
import { casesOf, type Facts } from '@/lib/demands';
import { connected, flowOf } from '@/lib/flow';
import { quantity } from '@/lib/format';
import { useQueryChoice, useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
import { Neighbours, Parts, ShearTable } from '@/parts/path-tables';
import { Pending } from '@/parts/problem';
import { CaseSense, Select } from '@/parts/select';

export default function PathPage() {
  const { projectId, revisionId, facts, error } = useRevision();
  return facts === undefined ? (
    <Pending error={error} what="the analysis" />
  ) : (
    <PathView projectId={projectId} revisionId={revisionId} facts={facts} />
  );
}

function PathView({
  projectId,
  revisionId,
  facts,
}: {
  readonly projectId: string;
  readonly revisionId: string;
  readonly facts: Facts;
}) {
  const { building, analysis } = facts;
  const cases = casesOf(analysis);
  const [caseId, setCase] = useQueryChoice('case', cases, cases[0] ?? '');
  const [senseText, setSense] = useQueryState('sense', '1');
  const sense: Sense = senseText === '-1' ? -1 : 1;
  const [member, setMember] = useQueryState('member', '');
  const [ref, width] = useWidth<HTMLDivElement>();
  const flow = useMemo(() => flowOf(facts, { caseId, sense }), [facts, caseId, sense]);
  const lit = useMemo(() => (member === '' ? undefined : connected(facts, member, caseId)), [facts, member, caseId]);
  const members = useMemo(() => membersOf(facts, caseId), [facts, caseId]);
  const trace = useQuery({
    queryKey: ['trace', revisionId, member, caseId],
    queryFn: () => api.trace(projectId, revisionId, member, caseId),
    enabled: member !== '',
  });
  const { force } = building.units;
  const pick = (picked: string): void => setMember(picked === member ? '' : picked);
  return (
    <>
      <div className="bar">
        <CaseSense cases={cases} caseId={caseId} sense={sense} onCase={setCase} onSense={setSense} />
        <Select
          label="Follow a member up and down"
          value={member}
          options={[
            { value: '', name: 'pick one here or in the drawing' },
            ...members.map((value) => ({ value, name: value })),
          ]}
          onChange={setMember}
        />
      </div>
      <div className="split">
        <div className="wide" ref={ref}>
          {width > 0 && (
            <div className="scroll">
              <FlowDrawing view={{ flow, unit: force, shown: member, lit }} width={width} onPick={pick} />
            </div>
          )}
          <ul className="legend">
            <li>all widths are forces on one scale</li>
            <li>band: what the diaphragm carries on from line to line, until nothing is left</li>
            <li>small figure: what the level gives to the line; large: its shear</li>
            <li>broken edge: against the load</li>
          </ul>
        </div>
        <div className="stack wide">
          {member === '' ? (
            <>
              <p className="note">
                Pick a mass, a wall line in a storey or a support to see which masses feed it and at which supports its
                force ends; spans, collectors, piers and end posts are in the list above.
              </p>
              <ShearTable
                facts={facts}
                lines={flow.columns.map(({ line }) => line)}
                caseId={caseId}
                sense={sense}
                onPick={setMember}
              />
            </>
          ) : trace.data === undefined ? (
            <Pending error={trace.error} what={`the path of ${member}`} />
          ) : (
            <>
              <section className="panel">
                <h2>{member}</h2>
                <p>{`Carries ${quantity(trace.data.force * sense, force, 4)} under ${caseId}.`}</p>
              </section>
              <Parts
                title="Up: the masses that feed it"
                parts={trace.data.up}
                sense={sense}
                unit={force}
                onPick={setMember}
              />
              <Parts
                title="Down: the supports where it ends"
                parts={trace.data.down}
                sense={sense}
                unit={force}
                onPick={setMember}
              />
              <Neighbours facts={facts} member={member} caseId={caseId} sense={sense} onPick={setMember} />
            </>
          )}
        </div>
      </div>
    </>
  );
}

/** Members that the path has under the case, in order. */
function membersOf({ analysis }: Facts, caseId: string): string[] {
  const used = new Set(
    analysis.path.edges.filter((edge) => edge.case === caseId).flatMap((edge) => [edge.from, edge.to]),
  );
  const members = analysis.path.nodes.filter(({ id }) => used.has(id)).map(({ member }) => member);
  return [...new Set(members)].sort((a, b) => a.localeCompare(b, 'en', { numeric: true }));
}
