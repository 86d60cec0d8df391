/** Bases of design: one block of keys for each standard and hazard. Several may stand side by side in one building. */
import { z } from 'zod';
import { Combinations } from './combination.js';
import { Id, LIMIT, Name, Positive, Weight } from './values.js';

export const AsceSeismic = z.strictObject({
  SDS: Positive,
  SD1: Positive,
  S1: Weight.optional().describe('Default 0: the limit for S1 ≥ 0.6 does not apply'),
  TL: Positive.optional().describe('Long-period transition [s]; default 8'),
  R: Positive,
  overstrength: Positive.optional().describe('Ω₀; default 1'),
  reduceOverstrength: z
    .boolean()
    .optional()
    .describe('Take 0.5 off an Ω₀ of 2.5 or more where every diaphragm is flexible; default false'),
  lightFrame: z
    .boolean()
    .optional()
    .describe('Braced by light-frame shear walls alone, whose collectors need not take Ω₀; default false'),
  Cd: Positive.optional().describe('Default R'),
  importance: Positive.optional().describe('Iₑ; default 1'),
  redundancy: z.number().min(1).max(1.3).optional().describe('ρ; default 1'),
  redundancyRule: z
    .enum(['stated', 'determined'])
    .optional()
    .describe(
      'Where ρ comes from: `redundancy`, or what the loss of one wall does to each storey, in each direction; default stated',
    ),
  accidentalTorsion: z
    .enum(['stated', 'required'])
    .optional()
    .describe(
      'Accidental eccentricity of load cases from this basis: as each case states it, or ±5 % with amplification where a case states none and a torsional irregularity asks for it; default stated',
    ),
  shortPeriodCap: z
    .boolean()
    .optional()
    .describe(
      'Cₛ from an SDS of 1, but not less than 70 % of it, with up to five storeys, T ≤ 0.5 s and ρ = 1: states that the structure is regular, of risk category I or II and not on site class E or F; default false',
    ),
  designCategory: z
    .enum(['A', 'B', 'C', 'D', 'E', 'F'])
    .optional()
    .describe(
      'Seismic design category; without one no overstrength for collectors and under walls that stop, and no other rule that hangs on it',
    ),
  period: Positive.optional().describe('T [s]; default the approximate period Cₜ hₙˣ'),
  periodSystem: z
    .enum(['steel moment frames', 'concrete moment frames', 'eccentrically or buckling-restrained braced', 'all other'])
    .optional()
    .describe('System by which Cₜ and x of the approximate period are taken; default all other'),
  Ct: Positive.optional().describe('Cₜ for hₙ in feet; default that of `periodSystem`, 0.02'),
  x: Positive.optional().describe('Default that of `periodSystem`, 0.75'),
});

/** ASCE 7 chapters 26 and 27, directional procedure: main wind force resisting system, enclosed or partially enclosed. */
export const AsceWind = z.strictObject({
  V: Positive.describe('Basic wind speed: mi/h in a file in feet, m/s in a file in metres'),
  exposure: z.enum(['B', 'C', 'D']),
  Kzt: Positive.optional().describe('Topography, the same at all heights; default 1'),
  Kd: Positive.optional().describe('Directionality; default 0.85'),
  Ke: Positive.optional().describe('Ground elevation; default 1'),
  G: Positive.optional().describe('Gust effect; default 0.85, the value for rigid buildings'),
  ground: z
    .number()
    .min(-LIMIT)
    .max(LIMIT)
    .optional()
    .describe('Elevation of the ground from which heights count [length]; default the lowest level'),
  roofHeight: Positive.optional().describe(
    'Mean roof height h above the ground, for the leeward wall [length]; default that of the highest level',
  ),
  heightRule: z
    .enum(['floor', 'mean'])
    .optional()
    .describe(
      'Height at which a floor takes K_z: its own, or the mean over the half storeys that it carries; default floor',
    ),
  parapet: Positive.optional().describe('Height of the parapet on every roof [length]; default none'),
  torsion: z
    .boolean()
    .optional()
    .describe(
      'Run 75 % of the wind with an eccentricity of ±15 % of the width where a diaphragm is rigid; default true',
    ),
});

/** EN 1998-1 4.3.3.2, the lateral force method of analysis. */
export const EnSeismic = z.strictObject({
  agR: Positive.describe('Reference peak ground acceleration on ground of type A, over the acceleration of gravity'),
  groundType: z.enum(['A', 'B', 'C', 'D', 'E']),
  spectrum: z.enum(['type 1', 'type 2']).optional().describe('Default type 1'),
  q: z.number().min(1).max(20).describe('Behaviour factor'),
  importance: Positive.optional().describe('γI; default 1'),
  period: Positive.optional().describe('T₁ [s]; default Cₜ·H^0.75'),
  Ct: Positive.optional().describe('Cₜ for H in metres; default 0.05'),
  lambda: z
    .number()
    .positive()
    .max(1)
    .optional()
    .describe('λ; default 0.85 where T₁ ≤ 2·T_C and the building has more than two storeys, else 1'),
  psiE: z
    .number()
    .min(0)
    .max(1)
    .optional()
    .describe(
      'ψ_E, the part of live load that belongs to the seismic mass; default 0.3: ψ₂ of categories A and B, φ = 1',
    ),
  beta: Weight.optional().describe('Lower bound of the design spectrum over a_g; default 0.2'),
  diaphragmOverstrength: z
    .number()
    .min(1)
    .max(5)
    .optional()
    .describe('γd on the forces of diaphragms; default 1.3, the value for brittle failure'),
});

const head = {
  combinations: Combinations.optional().describe(
    'Combinations of the load cases that take this basis; default the file’s `combinations`',
  ),
};

const asce = { seismic: AsceSeismic.optional(), wind: AsceWind.optional() };
const asce716 = { standard: z.literal('ASCE 7-16'), ...asce, ...head };
const asce722 = { standard: z.literal('ASCE 7-22'), ...asce, ...head };
const en1998 = { standard: z.literal('EN 1998-1'), seismic: EnSeismic, ...head };

export const Basis = z.discriminatedUnion('standard', [
  z.strictObject(asce716),
  z.strictObject(asce722),
  z.strictObject(en1998),
]);

const named = { id: Id, name: Name.optional() };

export const NamedBasis = z.discriminatedUnion('standard', [
  z.strictObject({ ...named, ...asce716 }),
  z.strictObject({ ...named, ...asce722 }),
  z.strictObject({ ...named, ...en1998 }),
]);

export type Basis = z.infer<typeof Basis>;
export type NamedBasis = z.infer<typeof NamedBasis>;
export type AsceBasis = Extract<Basis, { standard: 'ASCE 7-16' | 'ASCE 7-22' }>;
export type EnBasis = Extract<Basis, { standard: 'EN 1998-1' }>;
export type AsceSeismic = z.infer<typeof AsceSeismic>;
export type AsceWind = z.infer<typeof AsceWind>;
export type EnSeismic = z.infer<typeof EnSeismic>;
