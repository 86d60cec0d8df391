/** The workings by kind of member and quantity: each fills the steps of one demand. */
import type { Demand, DemandKind, Quantity } from '../path/result.js';
import { collectorAxial } from './collectors.js';
import type { Context } from './context.js';
import {
  endCompression,
  endTension,
  supportBearing,
  supportMoment,
  supportShear,
  supportUplift,
} from './end-forces.js';
import { centreOfRigidity } from './centre-of-rigidity.js';
import { levelDiaphragmForce, levelForce } from './level-forces.js';
import {
  bowDeflection,
  bowRatio,
  drift,
  levelOverturning,
  storeyShear,
  torsion,
  torsionalAmplification,
  torsionalRatio,
} from './levels.js';
import { centreOfMass } from './mass.js';
import { openingChord, openingCorner, openingMoment } from './openings.js';
import { pierDeflectionWorking } from './pier-deflection.js';
import { holdDownRatio, pierRatio } from './pier-ratios.js';
import { pierShear, pierUnitShear } from './piers.js';
import { spanChord, spanMoment, spanShear, spanUnitShear } from './spans.js';
import type { Steps } from './steps.js';
import { lineOverturning, lineReaction, lineShear } from './wall-lines.js';

/** Adds the steps of a demand; the last one gives it. */
export type Explain = (context: Context, demand: Demand, steps: Steps) => void;

const WORKINGS: Readonly<Partial<Record<DemandKind, Readonly<Partial<Record<Quantity, Explain>>>>>> = {
  level: {
    force: levelForce,
    'diaphragm-force': levelDiaphragmForce,
    'storey-shear': storeyShear,
    'overturning-moment': levelOverturning,
    'centre-of-mass-x': centreOfMass(0),
    'centre-of-mass-y': centreOfMass(1),
    'centre-of-rigidity-x': centreOfRigidity('x'),
    'centre-of-rigidity-y': centreOfRigidity('y'),
    torsion,
    'torsional-ratio': torsionalRatio,
    'torsional-amplification': torsionalAmplification,
    drift,
    deflection: bowDeflection,
    'deflection-ratio': bowRatio,
  },
  'diaphragm-span': {
    shear: spanShear,
    'unit-shear': spanUnitShear,
    moment: spanMoment,
    'chord-force': spanChord,
  },
  opening: { 'secondary-moment': openingMoment, 'chord-force': openingChord, 'corner-force': openingCorner },
  collector: { 'axial-tension': collectorAxial, 'axial-compression': collectorAxial },
  'wall-line': { reaction: lineReaction, shear: lineShear, 'overturning-moment': lineOverturning },
  pier: {
    shear: pierShear,
    'unit-shear': pierUnitShear,
    deflection: pierDeflectionWorking,
    ratio: pierRatio,
    'hold-down-ratio': holdDownRatio,
    'end-tension': endTension,
    'end-compression': endCompression,
  },
  support: { shear: supportShear, uplift: supportUplift, bearing: supportBearing, moment: supportMoment },
};

export function workingFor(kind: DemandKind, quantity: Quantity): Explain | undefined {
  return WORKINGS[kind]?.[quantity];
}
