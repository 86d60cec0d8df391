'use client';
import type { Foundation, Support, SupportDemand, SupportQuantity } from '@groundward/engine/foundation/result';
import { useState } from 'react';
import { dimension, figure, quantity, senseSign } from '@/lib/format';
import { Table } from './table';

export const QUANTITIES = ['uplift', 'bearing', 'shear', 'moment'] as const satisfies readonly SupportQuantity[];

/** One row a support: the governing demand of every quantity, with its case, sense and combination. */
export function Schedule({
  supports,
  shown,
  onPick,
  units,
}: {
  readonly supports: readonly Support[];
  readonly shown: string;
  readonly onPick: (member: string) => void;
  readonly units: Foundation['units'];
}) {
  return (
    <section className="panel wide">
      <h2>{`Governing demands of ${supports.length} support${supports.length === 1 ? '' : 's'}`}</h2>
      <Table label="Governing demands by support">
        <thead>
          <tr>
            <th>Label</th>
            <th>Member</th>
            <th className="n">{`x, y [${units.length}]`}</th>
            {QUANTITIES.map((what) => (
              <th key={what} className="n">
                {what}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {supports.map((support) => (
            <tr key={support.member} className={support.member === shown ? 'on' : undefined}>
              <th scope="row">
                <button className="quiet" onClick={() => onPick(support.member === shown ? '' : support.member)}>
                  {support.label}
                </button>
              </th>
              <td>{support.member}</td>
              <td className="n">{`${dimension(support.at[0])}, ${dimension(support.at[1])}`}</td>
              {QUANTITIES.map((what) => (
                <td key={what} className="n">
                  <Governing support={support} what={what} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}

function Governing({ support, what }: { readonly support: Support; readonly what: SupportQuantity }) {
  const demand = support.demands.find((candidate) => candidate.quantity === what && candidate.governing);
  if (demand === undefined) return <span className="note">–</span>;
  return (
    <span className="figure" tabIndex={-1} data-from={originOf(support, demand)}>
      {quantity(demand.value, demand.unit)}
      <span className="by">{`${demand.case} ${senseSign(demand.sense)}, ${demand.combination ?? 'unfactored'}`}</span>
    </span>
  );
}

function originOf(support: Support, demand: SupportDemand): string {
  return `${support.label} (${support.member}): ${demand.quantity} ${quantity(demand.value, demand.unit, 5)}.\nCase ${demand.case}, sense ${senseSign(demand.sense)}, ${demand.combination ?? 'unfactored'}${demand.governing ? '; governs its quantity here' : ''}.`;
}

const MOST_ROWS = 400;

/** Every demand that the filters leave; the governing ones are marked. */
export function DemandTable({
  rows,
}: {
  readonly rows: readonly { readonly support: Support; readonly demand: SupportDemand }[];
}) {
  const [all, setAll] = useState(false);
  const visible = all ? rows : rows.slice(0, MOST_ROWS);
  return (
    <section className="panel wide">
      <h2>{`${rows.length} demands; ◀ governs`}</h2>
      <Table label="Demands by support, component and combination">
        <thead>
          <tr>
            <th>Label</th>
            <th>Member</th>
            <th>Quantity</th>
            <th className="n">Value</th>
            <th />
            <th>Component</th>
            <th>Combination</th>
          </tr>
        </thead>
        <tbody>
          {visible.map(({ support, demand }, i) => (
            <tr key={i} className={demand.governing ? 'strong' : undefined}>
              <th scope="row">{support.label}</th>
              <td>{support.member}</td>
              <td>{demand.quantity}</td>
              <td className="n">
                <span className="figure" tabIndex={-1} data-from={originOf(support, demand)}>
                  {quantity(demand.value, demand.unit)}
                </span>
              </td>
              <td>{demand.governing ? <span title="governs">◀</span> : ''}</td>
              <td>{`${demand.case} ${senseSign(demand.sense)}`}</td>
              <td>{demand.combination ?? 'unfactored'}</td>
            </tr>
          ))}
        </tbody>
      </Table>
      {visible.length < rows.length && <button onClick={() => setAll(true)}>{`Show all ${rows.length}`}</button>}
    </section>
  );
}

export function Totals({ foundation }: { readonly foundation: Foundation }) {
  const { force, length } = foundation.units;
  return (
    <section className="panel" style={{ marginTop: 18 }}>
      <h2>Unfactored totals on the foundation</h2>
      <p className="note">{`Forces in ${force}; moments about the plan’s origin in ${force}·${length}, Mz the torsion.`}</p>
      <Table label="Unfactored totals on the foundation">
        <thead>
          <tr>
            <th>Component</th>
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
              <th scope="row">{`${total.case} ${senseSign(total.sense)}`}</th>
              {[total.fx, total.fy, total.fz, total.mx, total.my, total.mz].map((value, i) => (
                <td key={i} className="n">
                  {figure(value)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}
