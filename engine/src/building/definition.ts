/**
 * The building file `groundward.building/1`: the one definition from which the types, the reader, the JSON Schema,
 * the HTTP interface and the forms are made. Numbers are in the file's own units.
 */
import { z } from 'zod';

const LIMIT = 1e9;

// Half a character pair and the zero character cannot be kept by every database and every program.
const ID = /^[^\s/\p{Cc}\p{Cs}]+$/u;
const TEXT = /^[^\p{Cc}\p{Cs}]*$/u;

export const Id = z
  .string()
  .min(1)
  .max(64)
  .regex(ID, 'an id without white space, control characters and "/"')
  .describe('Identity for life: goes from revision to revision with its member; unique in its collection.');
const Name = z.string().min(1).max(200).regex(TEXT, 'text without control characters');
const Coordinate = z.number().min(-LIMIT).max(LIMIT);
const Weight = z.number().nonnegative().max(LIMIT);
const Positive = z.number().positive().max(LIMIT);

export const Point = z.tuple([Coordinate, Coordinate]).describe('[x, y] on plan [length]');
export const Ring = z
  .array(Point)
  .min(3)
  .max(2000)
  .describe('Simple polygon without a repeated last point, in either direction [length]');

export const Units = z
  .discriminatedUnion('length', [
    z.strictObject({ length: z.literal('ft'), force: z.literal('kip') }),
    z.strictObject({ length: z.literal('m'), force: z.literal('kN') }),
  ])
  .describe('Every number in the file and in its results is in these units and their products.');

export const GravityCase = z
  .enum(['D', 'L', 'Lr', 'S'])
  .describe('D dead, L live, Lr roof live, S snow: unfactored components of gravity load');

export const WeightZone = z.strictObject({
  id: Id,
  name: Name.optional(),
  outline: Ring.max(200),
  area: Weight.describe('Replaces the diaphragm’s own area weight inside the outline [force/length²]'),
});

export const WeightLine = z.strictObject({
  id: Id,
  name: Name.optional(),
  along: z.array(Point).min(2).max(2000).describe('Trace of a façade or partition on plan [length]'),
  perLength: Weight.describe('[force/length]'),
});

export const DiaphragmWeight = z.strictObject({
  area: Weight.optional().describe('Seismic weight of floor or roof [force/length²]; default 0'),
  zones: z.array(WeightZone).max(200).optional(),
  lines: z.array(WeightLine).max(2000).optional().describe('Façades and partitions, added to area weights'),
});

export const Opening = z.strictObject({ id: Id, name: Name.optional(), outline: Ring });

export const Behaviour = z.enum(['flexible', 'rigid', 'semi-rigid', 'envelope']);

export const Diaphragm = z.strictObject({
  id: Id,
  name: Name.optional(),
  outline: Ring,
  openings: z.array(Opening).max(200).optional(),
  behaviour: Behaviour.optional().describe('Default flexible'),
  assembly: Id.optional().describe('A diaphragm assembly'),
  meshSize: Positive.optional().describe(
    'Largest side of a finite element of a semi-rigid diaphragm [length]; default a sixteenth of the side of a square of its area',
  ),
  weight: DiaphragmWeight.optional(),
});

export const Level = z.strictObject({
  id: Id,
  name: Name.optional(),
  elevation: Coordinate.describe('[length]; the lowest level is the base'),
  diaphragms: z.array(Diaphragm).max(50).optional(),
});

export const PierGravity = z.strictObject({
  case: GravityCase,
  perLength: Weight.describe('Gravity load on top of the pier, evenly along it [force/length]'),
});

export const Pier = z.strictObject({
  id: Id,
  name: Name.optional(),
  from: Coordinate.describe('Distance along the wall line’s axis to the near end [length]'),
  to: Coordinate.describe('Distance along the wall line’s axis to the far end [length]'),
  assembly: Id.optional().describe('A wall assembly'),
  holdDown: Id.optional().describe('A hold-down assembly, at both ends'),
  stiffness: Positive.optional().describe('Lateral stiffness along the line [force/length]'),
  endOffset: z
    .union([Weight, z.tuple([Weight, Weight])])
    .optional()
    .describe('Distance of the end posts from the pier’s ends, one number or [near, far] [length]; default 0'),
  gravity: z.array(PierGravity).max(100).optional(),
});

export const WallStorey = z.strictObject({
  under: Id.describe('The level which this storey of the wall line holds'),
  piers: z.array(Pier).min(1).max(500),
});

export const CollectorExtent = z.strictObject({
  level: Id,
  from: Coordinate.describe('Distance along the axis [length]'),
  to: Coordinate,
});

export const WallLine = z.strictObject({
  id: Id,
  name: Name.optional(),
  axis: z.tuple([Point, Point]).describe('Trace of the wall line’s vertical plane on plan'),
  shareBy: z
    .enum(['length', 'stiffness', 'deflection'])
    .optional()
    .describe('How the line’s force goes to its piers; default length'),
  collectors: z
    .array(CollectorExtent)
    .max(2000)
    .optional()
    .describe('Where a collector runs over less than the whole cut of the diaphragm at the line'),
  storeys: z.array(WallStorey).min(1).max(500),
});

const NominalUnitShear = z.strictObject({ seismic: Positive.optional(), wind: Positive.optional() });

export const DiaphragmAssembly = z.strictObject({
  id: Id,
  name: Name.optional(),
  nominalUnitShear: NominalUnitShear.optional().describe('[force/length]'),
  apparentShearStiffness: Positive.optional().describe('Gₐ [force/length]'),
  chordStiffness: Positive.optional().describe(
    'E·A of the chords along outline and openings of a semi-rigid diaphragm [force]; default none',
  ),
  axialStiffness: Positive.optional().describe(
    'Axial stiffness of the floor per unit width of a semi-rigid diaphragm [force/length]; default 2 Gₐ with stated chords, else 1000 Gₐ: no bending',
  ),
});

export const WallAssembly = z.strictObject({
  id: Id,
  name: Name.optional(),
  nominalUnitShear: NominalUnitShear.optional().describe('[force/length]'),
  apparentShearStiffness: Positive.optional().describe('Gₐ [force/length]'),
});

export const HoldDownAssembly = z.strictObject({
  id: Id,
  name: Name.optional(),
  allowableTension: Positive.optional().describe('[force]'),
  deflectionAtAllowable: Positive.optional().describe('[length]'),
});

export const Assemblies = z.strictObject({
  diaphragms: z.array(DiaphragmAssembly).max(2000).optional(),
  walls: z.array(WallAssembly).max(2000).optional(),
  holdDowns: z.array(HoldDownAssembly).max(2000).optional(),
});

export const SeismicBasis = z.strictObject({
  SDS: Positive,
  SD1: Positive,
  S1: Weight.optional().describe('Default 0: the limit for S1 ≥ 0.6 does not apply'),
  TL: Positive.optional().describe('Long-period transition [s]; default 8'),
  R: Positive,
  overstrength: Positive.optional().describe('Ω₀; default 1'),
  Cd: Positive.optional().describe('Default R'),
  importance: Positive.optional().describe('Iₑ; default 1'),
  redundancy: z.number().min(1).max(1.3).optional().describe('ρ; default 1'),
  designCategory: z.enum(['A', 'B', 'C', 'D', 'E', 'F']).optional(),
  period: Positive.optional().describe('T [s]; default the approximate period Cₜ hₙˣ'),
  Ct: Positive.optional().describe('Cₜ for hₙ in feet; default 0.02'),
  x: Positive.optional().describe('Default 0.75'),
});

export const Basis = z.strictObject({
  standard: z.enum(['ASCE 7-16', 'ASCE 7-22']),
  seismic: SeismicBasis.optional(),
});

const Direction = z
  .number()
  .min(-360)
  .max(360)
  .describe('Direction in which the load acts, degrees anticlockwise from +x; both senses are run');

export const Accidental = z.strictObject({
  ratio: z.number().positive().max(0.5).describe('Accidental eccentricity over the plan dimension across the load'),
  amplified: z
    .boolean()
    .optional()
    .describe('Amplify by Aₓ where the diaphragm is torsionally irregular; default false'),
});

export const LevelForce = z.strictObject({
  level: Id,
  force: z.number().min(-LIMIT).max(LIMIT).describe('Storey force set: for walls and all that they hand down [force]'),
  diaphragmForce: z
    .number()
    .min(-LIMIT)
    .max(LIMIT)
    .optional()
    .describe('Diaphragm design force; default the level’s force [force]'),
});

const Spread = z
  .enum(['weight', 'area', 'even'])
  .optional()
  .describe('How a level’s force lies on its diaphragms; default weight, and area where no weight is stated');

const caseHead = {
  id: z.string().min(1).max(32).regex(ID, 'an id without white space, control characters and "/"'),
  name: Name.optional(),
  direction: Direction,
  accidental: Accidental.optional(),
  spread: Spread,
};

export const StatedCase = z.strictObject({
  ...caseHead,
  kind: z.enum(['seismic', 'wind']),
  from: z.literal('stated'),
  forces: z.array(LevelForce).min(1).max(500),
});

export const BasisCase = z.strictObject({
  ...caseHead,
  kind: z.literal('seismic'),
  from: z.literal('basis'),
});

export const LoadCase = z.discriminatedUnion('from', [StatedCase, BasisCase]);

export const Combination = z.strictObject({
  id: z.string().min(1).max(64).regex(TEXT, 'text without control characters'),
  factors: z
    .strictObject({
      D: z.number().optional(),
      L: z.number().optional(),
      Lr: z.number().optional(),
      S: z.number().optional(),
      E: z.number().optional(),
      W: z.number().optional(),
    })
    .describe('Factors taken as stated: E and W multiply the load case’s own effect'),
});

export const Combinations = z
  .union([
    z.enum(['ASCE 7-16 allowable', 'ASCE 7-16 strength', 'ASCE 7-22 allowable', 'ASCE 7-22 strength']),
    z.array(Combination).max(500),
  ])
  .describe(
    'A published set by name, or a list; default none, which leaves the unfactored components. The sets of ASCE 7-22 take S from a ground snow load of strength level, as that edition maps it.',
  );

export const Building = z
  .strictObject({
    schema: z.literal('groundward.building/1'),
    name: Name,
    units: Units,
    levels: z.array(Level).min(2).max(500),
    wallLines: z.array(WallLine).max(2000),
    assemblies: Assemblies.optional(),
    basis: Basis.optional(),
    loadCases: z.array(LoadCase).min(1).max(64),
    combinations: Combinations.optional(),
    postTolerance: Weight.optional().describe(
      'How far an end post may stand from the post below and still stand on it [length]; default 0.25 ft or 0.075 m',
    ),
  })
  .meta({ id: 'groundward.building/1', title: 'Groundward building file' });

export type Id = z.infer<typeof Id>;
export type Point = z.infer<typeof Point>;
export type Ring = z.infer<typeof Ring>;
export type Units = z.infer<typeof Units>;
export type GravityCase = z.infer<typeof GravityCase>;
export type Behaviour = z.infer<typeof Behaviour>;
export type Opening = z.infer<typeof Opening>;
export type Diaphragm = z.infer<typeof Diaphragm>;
export type Level = z.infer<typeof Level>;
export type Pier = z.infer<typeof Pier>;
export type WallLine = z.infer<typeof WallLine>;
export type LoadCase = z.infer<typeof LoadCase>;
export type StatedCase = z.infer<typeof StatedCase>;
export type Basis = z.infer<typeof Basis>;
export type SeismicBasis = z.infer<typeof SeismicBasis>;
export type Combination = z.infer<typeof Combination>;
export type Building = z.infer<typeof Building>;
