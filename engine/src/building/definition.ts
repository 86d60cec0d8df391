/**
 * The building file `groundward.building/1`: the one definition from which the types, the reader, the JSON Schema,
 * the HTTP interface and the forms are made. Numbers are in the file's own units.
 */
import { z } from 'zod';
import { Assemblies } from './assemblies.js';
import { Basis, NamedBasis } from './basis.js';
import { Combinations } from './combination.js';
import { LoadCase } from './load-cases.js';
import { Coordinate, GravityCase, Id, Name, Point, Positive, Ring, Weight } from './values.js';

export { GravityCase, Id, Point, Ring } from './values.js';
export type { DiaphragmAssembly, HoldDownAssembly, WallAssembly } from './assemblies.js';
export type { Basis, NamedBasis } from './basis.js';
export type { Combination } from './combination.js';
export type { CombinedCase, LoadCase, PlainCase, StatedCase } from './load-cases.js';

export const Units = z
  .discriminatedUnion('length', [
    z.strictObject({ length: z.literal('ft'), force: z.literal('kip') }),
    z.strictObject({ length: z.literal('m'), force: z.literal('kN') }),
  ])
  .describe('Every number in the file and in its results is in these units and their products.');

export const WeightZone = z.strictObject({
  id: Id,
  name: Name.optional(),
  outline: Ring.max(200),
  area: Weight.describe('Replaces the diaphragm’s own area weight inside the outline [force/length²]'),
  live: Weight.optional().describe('Live load inside the outline [force/length²]; default the diaphragm’s own'),
});

export const WeightLine = z.strictObject({
  id: Id,
  name: Name.optional(),
  along: z.array(Point).min(2).max(2000).describe('Trace of a façade or partition on plan [length]'),
  perLength: Weight.describe('[force/length]'),
});

export const DiaphragmWeight = z.strictObject({
  area: Weight.optional().describe('Seismic weight of floor or roof [force/length²]; default 0'),
  live: Weight.optional().describe(
    'Characteristic live load, of which the seismic mass of EN 1998-1 takes the part ψ_E [force/length²]; default 0',
  ),
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
  transferLength: Positive.optional().describe(
    'Greatest length, across the load, over which a chord that ends at a step of the outline or at an opening gives its force to the floor beside it [length]; default up to the next wall line or step, beyond the sides of an opening half the floor’s depth',
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

export const Building = z
  .strictObject({
    schema: z.literal('groundward.building/1'),
    name: Name,
    units: Units,
    levels: z.array(Level).min(2).max(500),
    wallLines: z.array(WallLine).max(2000),
    assemblies: Assemblies.optional(),
    basis: Basis.optional().describe('Basis of design of every load case that names none'),
    bases: z
      .array(NamedBasis)
      .max(20)
      .optional()
      .describe(
        'Further bases of design, side by side: a load case names the one that it takes; where the file has no other, the only one is every case’s',
      ),
    loadCases: z.array(LoadCase).min(1).max(64),
    combinations: Combinations.optional(),
    postTolerance: Weight.optional().describe(
      'How far an end post may stand from the post below and still stand on it [length]; default 0.25 ft or 0.075 m',
    ),
  })
  .meta({ id: 'groundward.building/1', title: 'Groundward building file' });

export type Units = z.infer<typeof Units>;
export type Behaviour = z.infer<typeof Behaviour>;
export type Opening = z.infer<typeof Opening>;
export type Diaphragm = z.infer<typeof Diaphragm>;
export type Level = z.infer<typeof Level>;
export type Pier = z.infer<typeof Pier>;
export type WallLine = z.infer<typeof WallLine>;
export type Building = z.infer<typeof Building>;
