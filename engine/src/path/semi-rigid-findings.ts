/** What semi-rigid diaphragms assume, how they classify, and whether their nodes are in equilibrium. */
import { AXIAL_OVER_SHEAR, AXIAL_WITH_CHORDS } from '../diaphragms/semi-rigid/membrane-model.js';
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import type { SpanDeflection } from '../diaphragms/semi-rigid/deflection.js';
import type { Bodies } from './bodies.js';
import { enter, type Ledger } from './certificate.js';
import type { Finding } from './result.js';
import type { CaseRun } from './run.js';
import { largestBow, ratioOf, semiRigidMotion } from './semi-rigid-motion.js';

/** A diaphragm that bows out more than this many times the average drift of its walls is flexible: ASCE 7-16 12.3.1.3. */
const FLEXIBLE = 2;
/** One that nowhere moves by more than this beyond a rigid one is rigid: EN 1998-1 4.3.1(4). */
const RIGID = 0.1;

export function semiRigidFindings(bodies: Bodies, runs: readonly CaseRun[]): Finding[] {
  const findings: Finding[] = [];
  for (const [diaphragm, { semiRigid }] of bodies) {
    if (semiRigid === undefined) continue;
    const { assumed, chord, sheet, size, mesh } = semiRigid.model;
    const member = diaphragm.key;
    if (assumed.axial) {
      const factor = chord > 0 ? AXIAL_WITH_CHORDS : AXIAL_OVER_SHEAR;
      const meaning =
        chord > 0 ? 'chords carry the bending' : 'without stated chords it shears and bends next to nothing';
      findings.push({
        code: 'axial-stiffness-assumed',
        severity: 'note',
        member,
        sentence: `Semi-rigid diaphragm ${member} has no stated axial stiffness: taken as ${factor} times its shear stiffness, so that ${meaning}.`,
        numbers: { axialStiffness: sheet.axial, shearStiffness: sheet.shear, factor },
      });
    }
    if (assumed.size) {
      findings.push({
        code: 'mesh-size-assumed',
        severity: 'note',
        member,
        sentence: `Semi-rigid diaphragm ${member} has no stated mesh size: elements of at most ${size.toPrecision(4)} a side.`,
        numbers: { size, unknowns: 2 * mesh.x.length },
      });
    }
    findings.push(...classification(diaphragm, runs));
  }
  return findings;
}

/** The case that decides by each of the published limits. */
function classification(diaphragm: DiaphragmModel, runs: readonly CaseRun[]): Finding[] {
  const member = diaphragm.key;
  let bowed: { caseId: string; ratio: number; bow: SpanDeflection } | undefined;
  let moved: { caseId: string; over: number } | undefined;
  for (const { subCase, outcomes } of runs) {
    const outcome = outcomes[diaphragm.level]?.diaphragms.find((candidate) => candidate.diaphragm === diaphragm);
    const motion = outcome === undefined ? undefined : semiRigidMotion(outcome, subCase.frame);
    if (motion === undefined || motion.largest === 0) continue;
    if (moved === undefined || motion.overRigid > moved.over) moved = { caseId: subCase.id, over: motion.overRigid };
    const bow = largestBow(motion);
    if (bow === undefined || bow.drift === 0) continue;
    const ratio = ratioOf(bow);
    if (bowed === undefined || ratio > bowed.ratio) bowed = { caseId: subCase.id, ratio, bow };
  }
  const findings: Finding[] = [];
  if (bowed !== undefined) {
    const { caseId, ratio, bow } = bowed;
    const verdict =
      ratio > FLEXIBLE ? 'more than 2, it may be taken as flexible' : 'at most 2, it may not be taken as flexible';
    findings.push({
      code: 'diaphragm-deflection',
      severity: 'note',
      member,
      case: caseId,
      sentence: `Under ${caseId} diaphragm ${member} bows out between ${bow.from} and ${bow.to} by ${ratio.toPrecision(3)} times the average drift of the walls there: ${verdict} (ASCE 7-16 12.3.1.3).`,
      numbers: { ratio, deflection: bow.deflection, drift: bow.drift, limit: FLEXIBLE },
    });
  }
  if (moved !== undefined) {
    const { caseId, over } = moved;
    findings.push({
      code: 'diaphragm-against-rigid',
      severity: 'note',
      member,
      case: caseId,
      sentence: `Under ${caseId} diaphragm ${member} moves up to ${(over * 100).toFixed(1)} % more than if it were rigid: ${over > RIGID ? 'more than 10 %, it may not be taken as rigid' : 'at most 10 %, it may be taken as rigid'} (EN 1998-1 4.3.1(4)).`,
      numbers: { over, limit: RIGID },
    });
  }
  return findings;
}

/** @returns whether there is any membrane */
export function checkMembranes(ledger: Ledger, bodies: Bodies): boolean {
  let any = false;
  for (const [diaphragm, { semiRigid }] of bodies) {
    if (semiRigid === undefined) continue;
    any = true;
    for (const { residual } of semiRigid.solved.values())
      enter(ledger, 'membrane: forces on nodes', `diaphragm ${diaphragm.key}`, residual, 1);
  }
  return any;
}
