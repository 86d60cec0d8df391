/** What semi-rigid diaphragms assume, how they classify, and whether their nodes are in equilibrium. */
import { AXIAL_OVER_SHEAR, AXIAL_WITH_CHORDS } from '../diaphragms/semi-rigid/membrane-model.js';
import type { Bodies } from './bodies.js';
import { enter, type Ledger } from './certificate.js';
import type { Finding } from './result.js';
import type { CaseRun } from './run.js';
import { largestBow, ratioOf, semiRigidMotion } from './semi-rigid-motion.js';

/** A diaphragm that bows out more than this many times the average drift of its walls is flexible: ASCE 7-16 12.3.1.3. */
const FLEXIBLE = 2;

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
    let worst: { caseId: string; ratio: number; deflection: number; drift: number; span: string } | undefined;
    for (const { subCase, outcomes } of runs) {
      const outcome = outcomes[diaphragm.level]?.diaphragms.find((candidate) => candidate.diaphragm === diaphragm);
      const bow = outcome === undefined ? undefined : largestBow(semiRigidMotion(outcome, subCase.frame));
      if (bow === undefined || bow.drift === 0) continue;
      const ratio = ratioOf(bow);
      if (worst !== undefined && ratio <= worst.ratio) continue;
      worst = { ...bow, caseId: subCase.id, ratio, span: `${bow.from}-${bow.to}` };
    }
    if (worst === undefined) continue;
    const flexible = worst.ratio > FLEXIBLE;
    findings.push({
      code: 'diaphragm-classification',
      severity: 'note',
      member,
      case: worst.caseId,
      sentence: `Under ${worst.caseId} diaphragm ${member} bows out between ${worst.span} by ${worst.ratio.toPrecision(3)} times the average drift of the walls there: ${flexible ? 'more than 2, it may be taken as flexible' : 'at most 2, it may not be taken as flexible by this limit'} (ASCE 7-16 12.3.1.3).`,
      numbers: { ratio: worst.ratio, deflection: worst.deflection, drift: worst.drift, limit: FLEXIBLE },
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
