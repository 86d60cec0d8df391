/** Demand over capacity of piers and their hold-downs, under the combination that governs each, and what follows from it. */
import type { FactoredCombination } from '../loads/combinations.js';
import type { Format } from '../walls/capacity.js';
import { pierCapacity, pierSlenderness } from '../walls/pier-capacity.js';
import type { PierFeet, PostDescent } from '../walls/posts.js';
import type { Model } from './model.js';
import type { Finding, Quantity, Sense } from './result.js';
import type { CaseRun } from './run.js';
import { put, type Table } from './table.js';
import { factored, type LateralComponent } from './wall-demands.js';

const SENSES: readonly Sense[] = [1, -1];

/** A load sub-case with the format of its combinations; undefined where each assembly states its own. */
export type RatedComponent = LateralComponent & { readonly run: CaseRun; readonly format: Format | undefined };

type Worst = { ratio: number; caseId: string; combination: string | undefined };

/** Rows `ratio` and `hold-down-ratio` of every pier where a capacity is stated, and a finding for each above 1. */
export function pierRatios(table: Table, descent: PostDescent, lateral: readonly RatedComponent[]): Finding[] {
  const findings: Finding[] = [];
  for (const foot of descent.feet.flat()) {
    findings.push(
      ...rated(table, foot, 'ratio', lateral, shearRatio),
      ...rated(table, foot, 'hold-down-ratio', lateral, holdDownRatio),
    );
  }
  return findings;
}

type Ratio = { readonly ratio: number; readonly combination: string | undefined };
type RatioOf = (foot: PierFeet, of: RatedComponent, sense: Sense) => Ratio | undefined;

function rated(
  table: Table,
  foot: PierFeet,
  quantity: Quantity,
  lateral: readonly RatedComponent[],
  ratioOf: RatioOf,
): Finding[] {
  const { key } = foot.pier;
  let worst: Worst | undefined;
  for (const of of lateral) {
    for (const sense of SENSES) {
      const found = ratioOf(foot, of, sense);
      if (found === undefined) continue;
      const { ratio, combination } = found;
      put(table, key, 'pier', quantity, of.id, sense, ratio, table.units.none, undefined, combination);
      if (worst === undefined || ratio > worst.ratio) worst = { ratio, caseId: of.id, combination };
    }
  }
  if (worst === undefined || !(worst.ratio > 1)) return [];
  const what = quantity === 'ratio' ? `Pier ${key}` : `The hold-down of pier ${key}`;
  const under = worst.combination === undefined ? worst.caseId : `${worst.caseId}, ${worst.combination}`;
  return [
    {
      code: quantity === 'ratio' ? 'pier-over-capacity' : 'hold-down-over-capacity',
      severity: 'warning',
      member: key,
      case: worst.caseId,
      sentence: `${what} is asked for ${worst.ratio.toPrecision(4)} times what its assembly may carry (${under}).`,
      numbers: { ratio: worst.ratio, limit: 1 },
    },
  ];
}

/** Unit shear over the design unit shear, under the combination with the largest factor on the load. */
function shearRatio({ storey, pier, line }: PierFeet, of: RatedComponent): Ratio | undefined {
  const { wall } = pier;
  const shear = (of.run.outcomes[storey.level]?.below[line.index]?.[0] ?? 0) * pier.share;
  if (wall === undefined || shear === 0) return undefined;
  const capacity = pierCapacity(storey, pier, of.run.subCase.loadCase.kind, of.format ?? wall.format);
  if (capacity === undefined) return undefined;
  const governing = of.combinations.reduce<FactoredCombination | undefined>(
    (best, each) => (best === undefined || Math.abs(each.lateral) > Math.abs(best.lateral) ? each : best),
    undefined,
  );
  const demand = (Math.abs(shear) / pier.length) * Math.abs(governing?.lateral ?? 1);
  return { ratio: demand / capacity.unitShear, combination: governing?.id };
}

/** The larger end tension over the tension of the hold-down, under the combination that pulls most. */
function holdDownRatio({ pier, near, far }: PierFeet, of: RatedComponent, sense: Sense): Ratio | undefined {
  const format = of.format ?? pier.wall?.format ?? 'allowable';
  const tension = format === 'allowable' ? pier.holdDown?.allowableTension : pier.holdDown?.strengthTension;
  const a = (near[of.component] as number) * sense;
  const b = (far[of.component] as number) * sense;
  if (tension === undefined || (a === 0 && b === 0)) return undefined;
  if (of.combinations.length === 0) return { ratio: Math.max(0, -a, -b) / tension, combination: undefined };
  let best: { ratio: number; combination: string } | undefined;
  for (const combination of of.combinations) {
    const pull = Math.max(
      0,
      -factored(near, combination, of.component, sense),
      -factored(far, combination, of.component, sense),
    );
    if (best === undefined || pull / tension > best.ratio)
      best = { ratio: pull / tension, combination: combination.id };
  }
  return best;
}

/** Piers more slender than their sheathing permits: no capacity is counted for them. */
export function slenderFindings(model: Model): Finding[] {
  return model.lines.flatMap((line) =>
    line.storeys.flatMap((storey) =>
      (storey?.piers ?? []).flatMap((pier): Finding[] => {
        const slender = storey === undefined ? undefined : pierSlenderness(storey, pier);
        if (slender === undefined || slender.permitted) return [];
        const { ratio, limit, clause } = slender;
        return [
          {
            code: 'pier-too-slender',
            severity: 'warning',
            member: pier.key,
            sentence: `Pier ${pier.key} is ${ratio.toPrecision(4)} times as high as long, more than ${limit} (${clause}, limit from memory): it has no ratio, since no capacity may be counted.`,
            numbers: { ratio, limit },
          },
        ];
      }),
    ),
  );
}
