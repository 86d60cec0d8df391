/** Findings: the engineer's work list. Each has a code, a severity, a member, a sentence and the numbers that decided it. */
import type { Point } from '../building/definition.js';
import type { Bodies } from './bodies.js';
import type { Model } from './model.js';
import { edgeDrifts, torsionalRatio } from './level-demands.js';
import type { Finding } from './result.js';
import type { CaseRun } from './run.js';
import { openingFindings } from './opening-findings.js';
import { stepFindings } from './step-findings.js';
import { cross, dot, frameAlong } from '../geometry/frame.js';
import type { Profile } from '../geometry/profile.js';
import type { Landing, PostDescent } from '../walls/posts.js';
import { distanceAt } from '../walls/wall-line.js';

/** What the plan and the path alone show, whatever the loads. */
export function planFindings(model: Model, bodies: Bodies, loadFrames: ReadonlySet<number>): Finding[] {
  const findings: Finding[] = [];
  for (const level of model.levels) {
    for (const diaphragm of level.diaphragms) {
      findings.push(...stepFindings(diaphragm, loadFrames), ...openingFindings(diaphragm, loadFrames));
      const body = bodies.get(diaphragm);
      if (body !== undefined && !body.absolute) {
        findings.push({
          code: 'stiffness-by-length',
          severity: 'note',
          member: diaphragm.key,
          sentence: `Rigid diaphragm ${diaphragm.key} shares its forces by length of wall, since not every pier under it has a stiffness or an assembly with one.`,
        });
      }
      if (diaphragm.behaviour === 'flexible') {
        for (const { line } of diaphragm.touches) {
          if (loadFrames.has(line.family) || line.storeys[level.index] === undefined) continue;
          findings.push({
            code: 'line-askew',
            severity: 'warning',
            member: `${line.line.id}/${level.id}`,
            sentence: `Wall line ${line.line.id} runs askew to every load case: flexible diaphragm ${diaphragm.key} gives it nothing.`,
          });
        }
      }
      findings.push(
        ...outlineFindings(model, diaphragm.key, diaphragm.diaphragm.outline, diaphragm.profiles[0] as Profile),
      );
    }
    findings.push(...pierFindings(model, level.index));
  }
  findings.push(...stopFindings(model));
  return findings;
}

/** ASCE 7-16 Table 12.3-1 types 2 and 3, the limits as in ASCE 7-05 Table 12.3-1. */
function outlineFindings(model: Model, member: string, outline: readonly Point[], profile: Profile): Finding[] {
  const findings: Finding[] = [];
  const gross =
    Math.abs(outline.reduce((sum, point, i) => sum + cross(point, outline[(i + 1) % outline.length] as Point), 0)) / 2;
  const net = profile.slabs.reduce((sum, slab) => sum + ((slab.depth0 + slab.depth1) / 2) * (slab.to - slab.from), 0);
  const open = 1 - net / gross;
  if (open > 0.5) {
    findings.push({
      code: 'diaphragm-discontinuity',
      severity: 'warning',
      member,
      sentence: `Openings take ${percent(open)} of diaphragm ${member}, more than 50 % (horizontal irregularity type 3).`,
      numbers: { open, limit: 0.5 },
    });
  }
  const frame = model.frames[0] ?? frameAlong([1, 0]);
  const s = outline.map((point) => dot(point, frame.s));
  const t = outline.map((point) => dot(point, frame.t));
  const box = { s0: Math.min(...s), s1: Math.max(...s), t0: Math.min(...t), t1: Math.max(...t) };
  const turn = Math.sign(
    outline.reduce((sum, point, i) => sum + cross(point, outline[(i + 1) % outline.length] as Point), 0),
  );
  let worst = { least: 0, alongS: 0, alongT: 0 };
  for (let i = 0; i < outline.length; i++) {
    const before = outline[(i + outline.length - 1) % outline.length] as Point;
    const here = outline[i] as Point;
    const after = outline[(i + 1) % outline.length] as Point;
    const a: Point = [here[0] - before[0], here[1] - before[1]];
    const b: Point = [after[0] - here[0], after[1] - here[1]];
    if (cross(a, b) * turn >= 0) continue;
    // The notch lies between the way back along the first edge and the way on along the second.
    const into: Point = [
      b[0] / Math.hypot(...b) - a[0] / Math.hypot(...a),
      b[1] / Math.hypot(...b) - a[1] / Math.hypot(...a),
    ];
    const hs = s[i] as number;
    const ht = t[i] as number;
    const alongS = (dot(into, frame.s) > 0 ? box.s1 - hs : hs - box.s0) / (box.s1 - box.s0);
    const alongT = (dot(into, frame.t) > 0 ? box.t1 - ht : ht - box.t0) / (box.t1 - box.t0);
    const least = Math.min(alongS, alongT);
    if (least > worst.least) worst = { least, alongS, alongT };
  }
  if (worst.least > 0.15) {
    findings.push({
      code: 're-entrant-corner',
      severity: 'warning',
      member,
      sentence: `Diaphragm ${member} projects beyond a re-entrant corner by ${percent(worst.alongS)} and ${percent(worst.alongT)} of its dimensions, both more than 15 % (horizontal irregularity type 2).`,
      numbers: { first: worst.alongS, second: worst.alongT, limit: 0.15 },
    });
  }
  return findings;
}

/** Piers that reach beyond the floor that they hold. */
function pierFindings(model: Model, level: number): Finding[] {
  const findings: Finding[] = [];
  const diaphragms = model.levels[level]?.diaphragms ?? [];
  for (const line of model.lines) {
    const cuts = diaphragms.flatMap((d) => d.touches.filter((touch) => touch.line === line).map((touch) => touch.cut));
    if (cuts.length === 0) continue;
    const reach = cuts
      .flatMap((cut) => [...cut.left, ...cut.right])
      .flatMap(([a, b]) => [distanceAt(line, a), distanceAt(line, b)]);
    const low = Math.min(...reach);
    const high = Math.max(...reach);
    const tolerance = 1e-9 * model.extent;
    for (const pier of line.storeys[level]?.piers ?? []) {
      if (pier.from >= low - tolerance && pier.to <= high + tolerance) continue;
      findings.push({
        code: 'pier-beyond-diaphragm',
        severity: 'warning',
        member: pier.key,
        sentence: `Pier ${pier.key} reaches beyond the floor on its line: the collector must be drawn out to it.`,
        numbers: { from: pier.from, to: pier.to, floorFrom: low, floorTo: high },
      });
    }
  }
  return findings;
}

/** Wall lines that stop above the base. */
function stopFindings(model: Model): Finding[] {
  const findings: Finding[] = [];
  for (const line of model.lines) {
    for (let level = 1; level < model.levels.length; level++) {
      if (line.storeys[level] !== undefined || line.storeys[level + 1] === undefined) continue;
      const id = model.levels[level]?.id ?? '';
      findings.push({
        code: 'wall-stops',
        severity: 'warning',
        member: `${line.line.id}/${model.levels[level + 1]?.id ?? ''}`,
        sentence: `Wall line ${line.line.id} stops at level ${id}: its shear is transferred through the diaphragm to other lines.`,
      });
    }
  }
  return findings;
}

/** End posts that do not stand on end posts. */
export function postFindings(model: Model, descent: PostDescent): Finding[] {
  const findings: Finding[] = [];
  for (const landing of descent.landings) {
    const finding = postFinding(model, landing);
    if (finding !== undefined) findings.push(finding);
  }
  return findings;
}

function postFinding(model: Model, { on, column, level, foot }: Landing): Finding | undefined {
  const id = model.levels[level]?.id ?? '';
  const numbers = { at: column.at };
  if (on === 'stands') return undefined;
  if (on === 'nothing') {
    return {
      code: 'post-on-nothing',
      severity: 'open-end',
      member: column.key,
      sentence: `End post ${column.key} stands on no pier at level ${id} and no member is named for it: its force is carried straight down as a point demand.`,
      numbers,
    };
  }
  const pier = foot?.pier.key ?? '';
  return on === 'within'
    ? {
        code: 'post-within-pier',
        severity: 'warning',
        member: column.key,
        sentence: `End post ${column.key} lands between the end posts of pier ${pier}, which share its force by statics.`,
        numbers,
      }
    : {
        code: 'post-on-another-line',
        severity: 'note',
        member: column.key,
        sentence: `End post ${column.key} lands on pier ${pier} of another wall line.`,
        numbers,
      };
}

/** ASCE 7-16 Table 12.3-1 types 1a and 1b, for seismic cases, before any amplification. */
export function torsionFindings({ subCase, outcomes, plain }: CaseRun): Finding[] {
  if (subCase.loadCase.kind !== 'seismic') return [];
  return (plain?.outcomes ?? outcomes).flatMap((outcome) =>
    (outcome?.diaphragms ?? []).flatMap((diaphragm): Finding[] => {
      const member = outcome?.diaphragms.length === 1 ? outcome.level.id : diaphragm.diaphragm.key;
      const ratio = torsionalRatio(edgeDrifts(diaphragm, subCase));
      if (ratio === undefined || ratio <= 1.2) return [];
      const extreme = ratio > 1.4;
      const limit = extreme ? 1.4 : 1.2;
      return [
        {
          code: extreme ? 'extreme-torsional-irregularity' : 'torsional-irregularity',
          severity: 'warning',
          member,
          case: subCase.id,
          sentence: `Under ${subCase.id} the largest edge drift under ${member} is ${ratio.toPrecision(4)} times the average, more than ${limit} (horizontal irregularity type 1${extreme ? 'b' : 'a'}).`,
          numbers: { ratio, limit },
        },
      ];
    }),
  );
}

function percent(value: number): string {
  return `${(value * 100).toFixed(1)} %`;
}
