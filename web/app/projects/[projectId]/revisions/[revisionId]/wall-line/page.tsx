'use client';
import type { WallLine } from '@groundward/engine/building/definition';
import type { Sense } from '@groundward/engine/path/result';
import { ElevationDrawing } from '@/drawings/elevation';
import type { PostState } from '@/drawings/elevation-signs';
import { useWidth } from '@/drawings/use-width';
import { axisOf, casesOf, combinationsOf, directionOf, type Facts } from '@/lib/demands';
import { useQueryChoice, useQueryPatch, useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
import { useOrigin } from '@/parts/facts';
import { Pending } from '@/parts/problem';
import { CaseSense, Select } from '@/parts/select';
import { severitySign } from '@/parts/title-block';
import { PierTable, StoreyTable } from '@/parts/wall-line-tables';

export default function WallLinePage() {
  const { facts, root, error } = useRevision();
  return facts === undefined ? (
    <Pending error={error} what="the analysis" />
  ) : (
    <WallLineView facts={facts} root={root} />
  );
}

function WallLineView({ facts, root }: { readonly facts: Facts; readonly root: string }) {
  const { building, analysis, index } = facts;
  const cases = casesOf(analysis);
  const origin = useOrigin();
  const patch = useQueryPatch();
  const [lineId] = useQueryState('line', '');
  const line = building.wallLines.find(({ id }) => id === lineId) ?? building.wallLines[0];
  const [asked] = useQueryChoice('case', cases, '');
  const [senseText, setSense] = useQueryState('sense', '1');
  const [wanted, setCombination] = useQueryState('combination', '');
  const [ref, width] = useWidth<HTMLDivElement>();
  if (line === undefined) return <p>The building has no wall line.</p>;
  const caseId = asked === '' ? caseFor(facts, line.id) : asked;
  const sense: Sense = senseText === '-1' ? -1 : 1;
  const combinations = combinationsOf(analysis, 'pier', caseId);
  const combination = combinations.includes(wanted) ? wanted : undefined;
  const findings = analysis.findings.filter(({ member }) => member === line.id || member.startsWith(`${line.id}/`));
  return (
    <>
      <div className="bar">
        <Select
          label="Wall line"
          value={line.id}
          options={building.wallLines.map((each) => ({ value: each.id, name: each.name ?? each.id }))}
          onChange={(id) => patch({ line: id, case: along(facts, id, caseId) ? caseId : '' })}
        />
        <CaseSense
          cases={cases}
          caseId={caseId}
          sense={sense}
          onCase={(id) => patch({ case: id, line: line.id })}
          onSense={setSense}
        />
        <Select
          label="End forces of"
          value={combination ?? ''}
          options={[
            { value: '', name: 'the case alone, unfactored' },
            ...combinations.map((value) => ({ value, name: value })),
          ]}
          onChange={setCombination}
        />
      </div>
      <div className="split">
        <div className="wide" ref={ref}>
          {width > 0 && (
            <div className="scroll">
              <ElevationDrawing
                view={{
                  building,
                  line,
                  forces: { index, caseId, sense, combination, origin },
                  posts: postsOf(findings),
                }}
                width={Math.max(width, leastWidth(line))}
              />
            </div>
          )}
          <ul className="legend">
            <li style={{ color: 'var(--force)' }}>→ from the level’s diaphragm; in a pier its shear and unit shear</li>
            <li style={{ color: 'var(--tension)' }}>↑ end post in tension, at its foot</li>
            <li style={{ color: 'var(--compression)' }}>↓ end post in compression</li>
            <li style={{ color: 'var(--alarm)' }}>✕ post that stands on nothing</li>
            <li style={{ color: 'var(--warn)' }}>△ post that lands between the posts of a pier</li>
            <li>{`end forces: ${combination ?? 'the case alone, without gravity'}, ${building.units.force}`}</li>
          </ul>
          {findings.length > 0 && (
            <section className="panel" style={{ marginTop: 18 }}>
              <h2>Findings on this line</h2>
              <ul className="plain">
                {findings.map((finding, i) => (
                  <li key={i}>
                    <span className={`tag ${finding.severity}`}>
                      {`${severitySign(finding.severity)} ${finding.severity}`}
                    </span>{' '}
                    {finding.sentence}
                  </li>
                ))}
              </ul>
            </section>
          )}
        </div>
        <div className="stack wide">
          <StoreyTable facts={facts} line={line} caseId={caseId} sense={sense} root={root} />
          <PierTable facts={facts} line={line} caseId={caseId} sense={sense} combination={combination} />
        </div>
      </div>
    </>
  );
}

/** Wide enough for the end forces of its shortest pier to stand side by side, within reason [px]. */
function leastWidth(line: WallLine): number {
  const shortest = Math.min(...line.storeys.flatMap(({ piers }) => piers.map(({ from, to }) => to - from)));
  return Math.min(1000, Math.max(620, 160 + (axisOf(line).length / shortest) * 84));
}

function along({ building, analysis }: Facts, lineId: string, caseId: string): boolean {
  const line = building.wallLines.find(({ id }) => id === lineId);
  const direction = directionOf(analysis, caseId);
  if (line === undefined || direction === undefined) return false;
  const { u } = axisOf(line);
  return Math.abs(u[0] * direction[0] + u[1] * direction[1]) > 0.5;
}

/** The first case that acts along the line. */
function caseFor(facts: Facts, lineId: string): string {
  const cases = casesOf(facts.analysis);
  return cases.find((caseId) => along(facts, lineId, caseId)) ?? cases[0] ?? '';
}

function postsOf(findings: Facts['analysis']['findings']): ReadonlyMap<string, PostState> {
  return new Map(
    findings.flatMap(({ code, member, sentence }) =>
      code === 'post-on-nothing' || code === 'post-within-pier'
        ? [[member, { rests: code === 'post-on-nothing' ? 'on-nothing' : 'within-pier', sentence }] as const]
        : [],
    ),
  );
}
