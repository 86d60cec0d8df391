'use client';
import type { Demand } from '@groundward/engine/path/result';
import { quantity } from '@/lib/format';
import { useQueryPatch } from '@/lib/query-state';
import { referenceOf } from '@/lib/working';
import { useHasWorking, useOrigin } from './facts';

/** A demand as a number with its unit; pointing at it, or reaching it by keys, says where it comes from; pressing it opens its working. */
export function Figure({
  demand,
  significant = 3,
}: {
  readonly demand: Demand | undefined;
  readonly significant?: number;
}) {
  const origin = useOrigin();
  const hasWorking = useHasWorking();
  const patch = useQueryPatch();
  if (demand === undefined) return <span className="note">–</span>;
  const text = quantity(demand.value, demand.unit, significant);
  if (!hasWorking) {
    return (
      <span className="figure" tabIndex={-1} data-from={origin(demand)}>
        {text}
      </span>
    );
  }
  return (
    <button
      type="button"
      className="figure"
      tabIndex={-1}
      data-from={origin(demand)}
      onClick={() => patch({ working: referenceOf(demand) })}
    >
      {text}
    </button>
  );
}
