/** Findings at the steps of an outline and where it parts into wings: transfer diaphragms without room or without a line to end in. */
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import type { StepPlan, TransferPlan } from '../diaphragms/steps/step.js';
import type { Profile, Slab, Wing } from '../geometry/profile.js';
import type { Finding } from './result.js';

/**
 * Largest ratio of depth across to length of a transfer diaphragm: the limit of blocked wood structural panels, SDPWS-2021 Table 4.2.4
 * (3 for unblocked ones); from memory, not checked against the document.
 */
export const SLENDER = 4;

export function stepFindings(diaphragm: DiaphragmModel, loadFrames: ReadonlySet<number>): Finding[] {
  const findings: Finding[] = [];
  const told = new Set<string>();
  for (const frame of loadFrames) {
    const profile = diaphragm.profiles[frame] as Profile;
    const wings = wingsFinding(diaphragm, profile);
    // One sentence of a kind for each member, whatever the number of directions.
    const add = (finding: Finding | undefined): void => {
      if (finding === undefined || told.has(`${finding.code} ${finding.member}`)) return;
      told.add(`${finding.code} ${finding.member}`);
      findings.push(finding);
    };
    add(wings);
    for (const step of diaphragm.steps[frame] ?? []) {
      add(openStep(diaphragm, step));
      for (const plan of step.transfers) {
        add(room(diaphragm, profile, plan));
        add(freeEnd(diaphragm, plan));
        add(openingWithin(diaphragm, profile, plan));
      }
    }
  }
  return findings;
}

/** The widest row of wings that a cut meets. */
function wingsFinding(diaphragm: DiaphragmModel, { slabs }: Profile): Finding | undefined {
  let widest: Slab | undefined;
  for (const slab of slabs) {
    if (slab.wings.length > 1 && slab.wings.length > (widest?.wings.length ?? 1)) widest = slab;
  }
  if (widest === undefined) return undefined;
  const depths = widest.wings.map((wing: Wing) => (wing.upper0 - wing.lower0 + wing.upper1 - wing.lower1) / 2);
  const whole = depths.reduce((sum, depth) => sum + depth, 0);
  const parts = depths.map((depth) => `${figure(depth)} deep takes ${((100 * depth) / whole).toFixed(0)} %`);
  return {
    code: 'cut-in-parts',
    severity: 'warning',
    member: diaphragm.key,
    sentence: `A cut through diaphragm ${diaphragm.key} meets ${depths.length} wings. They share shear and moment by depth (a wing ${parts.join(', one ')}), each with chords of its own. Where they stand on walls of different stiffness, draw them as diaphragms of their own or state the level as semi-rigid.`,
    numbers: {
      parts: depths.length,
      ...Object.fromEntries(depths.map((depth, i) => [`depth${i + 1}`, depth])),
    },
  };
}

function openStep({ key }: DiaphragmModel, step: StepPlan): Finding | undefined {
  const member = `${key}/${step.name}`;
  if (step.open === 'point') {
    return {
      code: 'step-without-common-depth',
      severity: 'open-end',
      member,
      sentence: `At ${step.name} of diaphragm ${key} the floor on one side does not reach the floor on the other: no chord can run through. Draw two diaphragms.`,
      numbers: { s: step.s },
    };
  }
  if (step.open === 'wings') {
    return {
      code: 'wings-change',
      severity: 'open-end',
      member,
      sentence: `At ${step.name} of diaphragm ${key} wings change their depths or meet other wings: their chords are not carried over. Draw the wings as diaphragms of their own or state the level as semi-rigid.`,
      numbers: { s: step.s },
    };
  }
  return undefined;
}

function room({ key }: DiaphragmModel, { tolerance }: Profile, plan: TransferPlan): Finding | undefined {
  const length = Math.abs(plan.step - plan.end);
  const depth = plan.upper - plan.lower;
  const member = `${key}/${plan.name}`;
  const numbers = { length, depth, limit: SLENDER };
  if (length <= tolerance) {
    return {
      code: 'transfer-without-room',
      severity: 'open-end',
      member,
      sentence: `The chord that ends at ${plan.name} of diaphragm ${key} finds no floor to run into (${ENDS[plan.endsAt]}): its force is not carried over.`,
      numbers,
    };
  }
  if (depth <= SLENDER * length * (1 + 1e-9)) return undefined;
  return {
    code: 'transfer-slender',
    severity: 'warning',
    member,
    sentence: `The transfer diaphragm at ${plan.name} of ${key} is ${figure(depth)} across on a length of ${figure(length)} (${ENDS[plan.endsAt]}), a ratio of ${(depth / length).toFixed(2)}, more than ${SLENDER}: lengthen it, or carry the chord on another way.`,
    numbers: { ...numbers, ratio: depth / length },
  };
}

const ENDS: Readonly<Record<TransferPlan['endsAt'], string>> = {
  line: 'up to the next wall line',
  step: 'up to the next step',
  stated: 'as stated',
  edge: 'up to the end of the floor',
  narrows: 'up to where the chord meets the edge of the floor',
  opening: 'up to an opening',
  wings: 'up to where the floor parts into wings',
};

/** A strut along the end of a transfer diaphragm takes its shears where no wall line's collector does. */
function freeEnd({ key }: DiaphragmModel, plan: TransferPlan): Finding | undefined {
  if (plan.endsAt === 'line' || plan.endsAt === 'step' || plan.step === plan.end) return undefined;
  return {
    code: 'transfer-without-line',
    severity: plan.endsAt === 'stated' ? 'note' : 'warning',
    member: `${key}/${plan.name}`,
    sentence: `The transfer diaphragm at ${plan.name} of ${key} ends at no wall line (${ENDS[plan.endsAt]}): a strut across the floor has to be built along its end.`,
    numbers: { length: Math.abs(plan.step - plan.end) },
  };
}

export function openingWithin(
  { key, diaphragm }: DiaphragmModel,
  profile: Profile,
  plan: TransferPlan,
): Finding | undefined {
  const from = Math.min(plan.step, plan.end) + profile.tolerance;
  const to = Math.max(plan.step, plan.end) - profile.tolerance;
  const [x, y] = profile.frame.s;
  const ids = (diaphragm.openings ?? [])
    .filter(({ outline }) => {
      const s = outline.map((point) => point[0] * x + point[1] * y);
      return Math.min(...s) < to && Math.max(...s) > from;
    })
    .map(({ id }) => id);
  if (ids.length === 0) return undefined;
  return {
    code: 'opening-in-transfer',
    severity: 'warning',
    member: `${key}/${plan.name}`,
    sentence: `Opening ${ids.join(', ')} lies in the transfer diaphragm at ${plan.name} of ${key}: net shears count the net depth, the bending of the strips beside the opening by what is transferred there is not counted. State a shorter transfer length or a semi-rigid level.`,
    numbers: { openings: ids.length },
  };
}

function figure(value: number): string {
  return String(Number(value.toPrecision(4)));
}
