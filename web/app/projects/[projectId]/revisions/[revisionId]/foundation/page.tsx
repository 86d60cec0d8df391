'use client';
import type { Building } from '@groundward/engine/building/definition';
import type { Foundation } from '@groundward/engine/foundation/result';
import { useQuery } from '@tanstack/react-query';
import { FoundationPlan } from '@/drawings/foundation-plan';
import { planBox } from '@/drawings/plan';
import { boxOf, fitWidth } from '@/drawings/scale';
import { useWidth } from '@/drawings/use-width';
import { api } from '@/lib/api';
import { useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
import { DemandTable, QUANTITIES, Schedule, Totals } from '@/parts/foundation-tables';
import { Pending } from '@/parts/problem';
import { Select } from '@/parts/select';

export default function FoundationPage() {
  const { projectId, revisionId, revision, building, error } = useRevision();
  const demands = useQuery({
    queryKey: ['foundation', revisionId, revision?.version],
    queryFn: () => api.foundation(projectId, revisionId),
    enabled: revision !== undefined,
    staleTime: Infinity,
  });
  if (building === undefined || demands.data === undefined)
    return <Pending error={error ?? demands.error} what="the foundation demands" />;
  return <FoundationView building={building} foundation={demands.data} csv={api.csvHref(projectId, revisionId)} />;
}

/** Labels need so much [px]. */
const LEAST = 560;
const UNFACTORED = 'unfactored';

function FoundationView({
  building,
  foundation,
  csv,
}: {
  readonly building: Building;
  readonly foundation: Foundation;
  readonly csv: string;
}) {
  const [shown, setShown] = useQueryState('support', '');
  const [show, setShow] = useQueryState('show', 'schedule');
  const [kind, setKind] = useQueryState('quantity', '');
  const [component, setComponent] = useQueryState('component', '');
  const [combination, setCombination] = useQueryState('combination', '');
  const [ref, width] = useWidth<HTMLDivElement>();
  const all = foundation.supports.flatMap((support) => support.demands);
  const components = [...new Set(all.map((demand) => demand.case))];
  const combinations = [...new Set(all.map((demand) => demand.combination ?? UNFACTORED))];
  const supports = foundation.supports.filter(({ member }) => shown === '' || member === shown);
  const rows = supports
    .flatMap((support) => support.demands.map((demand) => ({ support, demand })))
    .filter(({ demand }) => kind === '' || demand.quantity === kind)
    .filter(({ demand }) => component === '' || demand.case === component)
    .filter(({ demand }) => combination === '' || (demand.combination ?? UNFACTORED) === combination);
  const box = boxOf(planBox(building));
  const margin = { left: 36, right: 24, top: 24, bottom: 46 };
  return (
    <>
      <p className="caution">
        These demands support the judgement of a licensed engineer; local codes and licensed practice govern. They are
        not designs: anchors, hold-downs and footings are to be designed for them by whoever is responsible.
      </p>
      <div className="bar">
        <Select
          label="Show"
          value={show}
          options={[
            { value: 'schedule', name: 'governing, a row a support' },
            { value: 'all', name: 'every component and combination' },
          ]}
          onChange={setShow}
        />
        <Select
          label="Support"
          value={shown}
          options={[
            { value: '', name: 'all' },
            ...foundation.supports.map(({ label, member }) => ({ value: member, name: `${label} ${member}` })),
          ]}
          onChange={setShown}
        />
        {show === 'all' && (
          <>
            <Select label="Quantity" value={kind} options={choices(QUANTITIES)} onChange={setKind} />
            <Select label="Component" value={component} options={choices(components)} onChange={setComponent} />
            <Select label="Combination" value={combination} options={choices(combinations)} onChange={setCombination} />
          </>
        )}
        <a href={csv} download>
          Schedule as CSV
        </a>
      </div>
      <div className="split half">
        <div className="wide" ref={ref}>
          {width > 0 && (
            <div className="scroll">
              <FoundationPlan
                building={building}
                supports={foundation.supports}
                scale={fitWidth(box, Math.max(width, LEAST), margin)}
                box={box}
                shown={shown}
                onPick={(member) => setShown(member === shown ? '' : member)}
              />
            </div>
          )}
          <ul className="legend">
            <li>■ end post, filled where a combination lifts it</li>
            <li>◆ post carried straight down, with no pier under the lowest level</li>
            <li>● foot of a pier: shear and moment</li>
          </ul>
          <Totals foundation={foundation} />
        </div>
        {show === 'all' ? (
          <DemandTable rows={rows} />
        ) : (
          <Schedule supports={supports} shown={shown} onPick={setShown} units={foundation.units} />
        )}
      </div>
    </>
  );
}

function choices(values: readonly string[]): { readonly value: string; readonly name: string }[] {
  return [{ value: '', name: 'all' }, ...values.map((value) => ({ value, name: value }))];
}
