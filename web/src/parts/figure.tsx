import type { Demand } from '@groundward/engine/path/result';
import { originOf } from '@/lib/demands';
import { quantity } from '@/lib/format';

/** A demand as a number with its unit; pointing at it, or tabbing to it, says where it comes from. */
export function Figure({
  demand,
  significant = 3,
}: {
  readonly demand: Demand | undefined;
  readonly significant?: number;
}) {
  if (demand === undefined) return <span className="note">–</span>;
  const from = originOf(demand);
  return (
    <span className="figure" tabIndex={0} data-from={from} aria-label={from}>
      {quantity(demand.value, demand.unit, significant)}
    </span>
  );
}
