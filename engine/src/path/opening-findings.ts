/** Findings where the method for openings (strips that bend on their own, corners tied into the floor beyond) meets its limits. */
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import type { OpeningHalf, OpeningPlan } from '../diaphragms/openings/opening-plan.js';
import type { Profile } from '../geometry/profile.js';
import type { Finding } from './result.js';
import { openingWithin, SLENDER } from './step-findings.js';

export function openingFindings(diaphragm: DiaphragmModel, loadFrames: ReadonlySet<number>): Finding[] {
  const findings = new Map<string, Finding>();
  for (const frame of loadFrames) {
    const plans = diaphragm.openings[frame] ?? [];
    const profile = diaphragm.profiles[frame] as Profile;
    for (const plan of plans) {
      for (const finding of [
        slenderStrip(diaphragm, plan),
        ...plan.halves.map((half) => shortTie(diaphragm, profile, plan, half)),
        ...plan.halves.map(({ transfer }) => openingWithin(diaphragm, profile, transfer)),
        besideAnother(diaphragm, profile, plan, plans),
        lineThrough(diaphragm, profile, frame, plan),
      ]) {
        if (finding === undefined) continue;
        // One sentence of a kind for each opening: the one with the larger ratio.
        const key = `${finding.code} ${finding.member}`;
        const known = findings.get(key);
        if ((known?.numbers?.['ratio'] ?? -1) < (finding.numbers?.['ratio'] ?? 0)) findings.set(key, finding);
      }
    }
  }
  return [...findings.values()];
}

/** A strip that is long for its depth bends more than it shears. */
function slenderStrip({ key }: DiaphragmModel, plan: OpeningPlan): Finding | undefined {
  const depths = plan.halves.flatMap(({ beside }) => beside.map(([a, b]) => b - a));
  if (depths.length === 0) return undefined;
  const depth = Math.min(...depths);
  const length = plan.to - plan.from;
  const ratio = length / depth;
  if (ratio <= SLENDER * (1 + 1e-9)) return undefined;
  const { id } = plan.opening;
  return {
    code: 'opening-strip-slender',
    severity: 'warning',
    member: `${key}/${id}`,
    sentence: `Beside opening ${id} of diaphragm ${key} a strip ${figure(depth)} deep runs over ${figure(length)}, a ratio of ${ratio.toFixed(2)}, more than ${SLENDER}: it takes less than its share by depth. State the level as semi-rigid, or leave the strip out of the floor.`,
    numbers: { ratio, depth, length, limit: SLENDER },
  };
}

/** The floor beyond a side is too short to take the edges of the strips. */
function shortTie(
  { key }: DiaphragmModel,
  { tolerance }: Profile,
  { opening }: OpeningPlan,
  { transfer }: OpeningHalf,
): Finding | undefined {
  const length = Math.abs(transfer.step - transfer.end);
  const depth = transfer.upper - transfer.lower;
  const member = `${key}/${opening.id}`;
  if (length <= tolerance) {
    const atStep = transfer.endsAt === 'step';
    return {
      code: atStep ? 'opening-at-step' : 'opening-without-ties',
      severity: 'open-end',
      member,
      sentence: atStep
        ? `A side of opening ${opening.id} of diaphragm ${key} is in line with a step of the outline, where the outer edges of the strips end too: the forces of the strips are not tied in there. Move the one or the other, or state the level as semi-rigid.`
        : `Beyond a side of opening ${opening.id} of diaphragm ${key} there is no floor into which its corners could be tied: the forces of the strips are not carried on.`,
      numbers: { length, depth, limit: SLENDER },
    };
  }
  const ratio = depth / length;
  if (ratio <= SLENDER * (1 + 1e-9)) return undefined;
  return {
    code: 'opening-near-line',
    severity: 'warning',
    member,
    sentence: `Opening ${opening.id} of diaphragm ${key} lies ${figure(length)} from the next wall line, step or opening, where the floor is ${figure(depth)} deep, a ratio of ${ratio.toFixed(2)}, more than ${SLENDER}: its corner ties find little floor. Carry the floor's shear to the line by the strips alone, or state the level as semi-rigid.`,
    numbers: { length, depth, limit: SLENDER, ratio },
  };
}

/** Openings side by side are one opening only where their sides are in line. */
function besideAnother(
  { key }: DiaphragmModel,
  { tolerance }: Profile,
  plan: OpeningPlan,
  plans: readonly OpeningPlan[],
): Finding | undefined {
  const { id } = plan.opening;
  const other = plans.find(
    (each) =>
      each !== plan &&
      Math.min(each.to, plan.to) - Math.max(each.from, plan.from) > tolerance &&
      (Math.abs(each.from - plan.from) > tolerance || Math.abs(each.to - plan.to) > tolerance),
  );
  if (other === undefined) return undefined;
  const overlap = Math.min(other.to, plan.to) - Math.max(other.from, plan.from);
  return {
    code: 'openings-staggered',
    severity: 'warning',
    member: `${key}/${id}`,
    sentence: `Openings ${id} and ${other.opening.id} of diaphragm ${key} stand side by side over ${figure(overlap)} with sides that are not in line: each is taken with its own point of inflection. State the level as semi-rigid to see how they share.`,
    numbers: { overlap },
  };
}

/** A wall line that meets the floor between the sides of an opening makes V jump where one point of inflection is assumed. */
function lineThrough(
  { key, touches }: DiaphragmModel,
  { tolerance }: Profile,
  frame: number,
  plan: OpeningPlan,
): Finding | undefined {
  const touch = touches.find(
    ({ line }) => line.family === frame && line.s > plan.from + tolerance && line.s < plan.to - tolerance,
  );
  if (touch === undefined) return undefined;
  const { id } = plan.opening;
  return {
    code: 'line-through-opening',
    severity: 'warning',
    member: `${key}/${id}`,
    sentence: `Wall line ${touch.line.line.id} meets diaphragm ${key} between the sides of opening ${id}: the strips beside it are taken with one point of inflection at mid-opening, which the line's force moves. State the level as semi-rigid, or divide the opening at the line.`,
    numbers: { s: touch.line.s, from: plan.from, to: plan.to },
  };
}

function figure(value: number): string {
  return String(Number(value.toPrecision(4)));
}
