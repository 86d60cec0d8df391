/** Assemblies of diaphragms, walls and hold-downs: values of the engineer's own, or published ones by name. */
import { z } from 'zod';
import { panelDiaphragms } from '../walls/assemblies/panel-diaphragms.js';
import { panelWalls } from '../walls/assemblies/panel-walls.js';
import { Id, Name, Positive } from './values.js';

export const NominalUnitShear = z.strictObject({
  seismic: Positive.optional().describe('v_s [force/length]'),
  wind: Positive.optional().describe('v_w [force/length]'),
});

/** How a nominal unit shear becomes one that a design may use. */
const reduction = {
  edition: z
    .enum(['2015', '2021'])
    .optional()
    .describe('Edition of SDPWS whose reduction of nominal unit shears applies; default 2015'),
  format: z
    .enum(['allowable', 'strength'])
    .optional()
    .describe(
      'Reduction where the combinations are a list of the file’s own, or none; a published set brings its own; default allowable',
    ),
  specificGravity: z
    .number()
    .positive()
    .max(1.4)
    .optional()
    .describe('Of the framing; below 0.50 the nominal unit shear is multiplied by 1 − (0.5 − G); default 0.50'),
};

const DIAPHRAGMS = panelDiaphragms().map(({ id }) => id);
const WALLS = panelWalls().map(({ id }) => id);

export const DiaphragmAssembly = z.strictObject({
  id: Id,
  name: Name.optional(),
  published: z
    .enum(DIAPHRAGMS)
    .optional()
    .describe(
      'Blocked panels with nominal unit shears after SDPWS-2015 Table 4.2A (values from memory, not checked against the document); stated values go before; default none',
    ),
  nominalUnitShear: NominalUnitShear.optional().describe('[force/length]; default that of the published assembly'),
  ...reduction,
  apparentShearStiffness: Positive.optional().describe('Gₐ [force/length]'),
  chordStiffness: Positive.optional().describe(
    'E·A of the chords along outline and openings of a semi-rigid diaphragm [force]; default none',
  ),
  axialStiffness: Positive.optional().describe(
    'Axial stiffness of the floor per unit width of a semi-rigid diaphragm [force/length]; default 2 Gₐ with stated chords, else 1000 Gₐ: no bending',
  ),
});

export const FourTerm = z.strictObject({
  panelRigidity: Positive.describe('G_v·t_v through the thickness of the panel [force/length]'),
  nail: z.enum(['6d', '8d', '10d']),
  edgeSpacing: Positive.describe('Spacing of the nails at panel edges [length]'),
  grade: z.enum(['structural-1', 'sheathing']).optional().describe('Grade of the panel; default sheathing'),
});

export const WallAssembly = z.strictObject({
  id: Id,
  name: Name.optional(),
  published: z
    .enum(WALLS)
    .optional()
    .describe(
      'Blocked panels on one side, by grade, thickness [in], nail, edge spacing and panel, with nominal unit shears and Gₐ of SDPWS-2015 Table 4.3A; stated values go before; default none',
    ),
  nominalUnitShear: NominalUnitShear.optional().describe('[force/length]; default that of the published assembly'),
  ...reduction,
  apparentShearStiffness: Positive.optional().describe('Gₐ [force/length]; default that of the published assembly'),
  endPostStiffness: Positive.optional().describe(
    'E·A of one end post [force], for the bending term of the deflection; default none: end posts do not change their length',
  ),
  fourTerm: FourTerm.optional().describe(
    'Deflects by the four-term equation with the slip of its nails; default the three-term equation with Gₐ',
  ),
  sheathing: z
    .enum(['panels-blocked', 'panels-unblocked', 'plaster', 'gypsum', 'other'])
    .optional()
    .describe(
      'For the limit of height over length and the factor of slender piers; other: neither; default panels-blocked',
    ),
});

export const HoldDownAssembly = z.strictObject({
  id: Id,
  name: Name.optional(),
  allowableTension: Positive.optional().describe('Against allowable combinations [force]'),
  strengthTension: Positive.optional().describe('Against strength combinations [force]'),
  deflectionAtAllowable: Positive.optional().describe(
    'Vertical elongation of the hold-down system at the allowable tension, for the rotation term of the deflection [length]; default none: it does not give',
  ),
});

export const Assemblies = z.strictObject({
  diaphragms: z.array(DiaphragmAssembly).max(2000).optional(),
  walls: z.array(WallAssembly).max(2000).optional(),
  holdDowns: z.array(HoldDownAssembly).max(2000).optional(),
});

export type DiaphragmAssembly = z.infer<typeof DiaphragmAssembly>;
export type WallAssembly = z.infer<typeof WallAssembly>;
export type HoldDownAssembly = z.infer<typeof HoldDownAssembly>;
export type FourTerm = z.infer<typeof FourTerm>;
