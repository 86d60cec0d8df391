'use client';
import type { Building } from '@groundward/engine/building/definition';
import type { Foundation } from '@groundward/engine/foundation/result';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { FoundationPlan } from '@/drawings/foundation-plan';
import { planBox } from '@/drawings/plan';
import { boxOf, fitWidth } from '@/drawings/scale';
import { useWidth } from '@/drawings/use-width';
import { api } from '@/lib/api';
import { figure, quantity, senseSign } from '@/lib/format';
import { useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
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

const MOST_ROWS = 400;

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
  const [which, setWhich] = useQueryState('show', 'governing');
  const [kind, setKind] = useQueryState('quantity', '');
  const [combination, setCombination] = useQueryState('combination', '');
  const [all, setAll] = useState(false);
  const [ref, width] = useWidth<HTMLDivElement>();
  const combinations = [
    ...new Set(
      foundation.supports.flatMap((support) => support.demands.map((demand) => demand.combination ?? 'unfactored')),
    ),
  ];
  const rows = foundation.supports
    .filter((support) => shown === '' || support.member === shown)
    .flatMap((support) => support.demands.map((demand) => ({ support, demand })))
    .filter(({ demand }) => which === 'all' || demand.governing)
    .filter(({ demand }) => kind === '' || demand.quantity === kind)
    .filter(({ demand }) => combination === '' || (demand.combination ?? 'unfactored') === combination);
  const visible = all ? rows : rows.slice(0, MOST_ROWS);
  const box = boxOf(planBox(building));
  return (
    <>
      <p className="caution">
        These demands support the judgement of a licensed engineer; local codes and licensed practice govern. They are
        not designs: anchors, hold-downs and footings are to be designed for them by whoever is responsible.
      </p>
      <div className="bar">
        <Select
          label="Support"
          value={shown}
          options={[
            { value: '', name: 'all' },
            ...foundation.supports.map((support) => ({
              value: support.member,
              name: `${support.label} ${support.member}`,
            })),
          ]}
          onChange={setShown}
        />
        <Select
          label="Quantity"
          value={kind}
          options={[
            { value: '', name: 'all' },
            ...['uplift', 'bearing', 'shear', 'moment'].map((value) => ({ value, name: value })),
          ]}
          onChange={setKind}
        />
        <Select
          label="Combination"
          value={combination}
          options={[{ value: '', name: 'all' }, ...combinations.map((value) => ({ value, name: value }))]}
          onChange={setCombination}
        />
        <Select
          label="Show"
          value={which}
          options={[
            { value: 'governing', name: 'governing only' },
            { value: 'all', name: 'every component and combination' },
          ]}
          onChange={setWhich}
        />
        <a href={csv} download>
          Schedule as CSV
        </a>
      </div>
      <div className="split">
        <div className="wide" ref={ref}>
          {width > 0 && (
            <FoundationPlan
              building={building}
              supports={foundation.supports}
              scale={fitWidth(box, width, { left: 20, right: 20, top: 20, bottom: 20 })}
              shown={shown}
              onPick={(member) => setShown(member === shown ? '' : member)}
            />
          )}
          <ul className="legend">
            <li>■ end post; filled where it lifts</li>
            <li>● foot of a pier: shear and moment</li>
          </ul>
          <Totals foundation={foundation} />
        </div>
        <section className="panel wide">
          <h2>{`${rows.length} demands`}</h2>
          <div className="scroll">
            <table>
              <thead>
                <tr>
                  <th>Label</th>
                  <th>Member</th>
                  <th>Quantity</th>
                  <th className="n">Value</th>
                  <th>Case</th>
                  <th>Combination</th>
                </tr>
              </thead>
              <tbody>
                {visible.map(({ support, demand }, i) => (
                  <tr key={i} className={which === 'all' && demand.governing ? 'strong' : undefined}>
                    <td>{support.label}</td>
                    <td>{support.member}</td>
                    <td>
                      {demand.quantity}
                      {which === 'all' && demand.governing ? ' ◀' : ''}
                    </td>
                    <td
                      className="n"
                      title={`at ${figure(support.at[0])}, ${figure(support.at[1])} ${foundation.units.length}`}
                    >
                      {quantity(demand.value, demand.unit)}
                    </td>
                    <td>{`${demand.case} ${senseSign(demand.sense)}`}</td>
                    <td>{demand.combination ?? 'unfactored'}</td>
                  </tr>
                ))}
              </tbody>
            </table>
          </div>
          {visible.length < rows.length && <button onClick={() => setAll(true)}>{`Show all ${rows.length}`}</button>}
        </section>
      </div>
    </>
  );
}

function Totals({ foundation }: { readonly foundation: Foundation }) {
  const { force, length } = foundation.units;
  return (
    <section className="panel" style={{ marginTop: 18 }}>
      <h2>Unfactored totals on the foundation</h2>
      <p className="note">{`Forces in ${force}, moments about the plan’s origin in ${force}·${length}.`}</p>
      <div className="scroll">
        <table>
          <thead>
            <tr>
              <th>Case</th>
              {['Fx', 'Fy', 'down', 'Mx', 'My', 'Mz'].map((head) => (
                <th key={head} className="n">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {foundation.totals.map((total) => (
              <tr key={`${total.case} ${total.sense}`}>
                <td>{`${total.case} ${senseSign(total.sense)}`}</td>
                {[total.fx, total.fy, total.fz, total.mx, total.my, total.mz].map((value, i) => (
                  <td key={i} className="n">
                    {figure(value)}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}
