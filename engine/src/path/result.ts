/**
 * What an analysis answers, `groundward.analysis/1`: one tidy demand table, the diagrams behind it, the path graph,
 * findings and the certificate. The JSON Schema of the analysis is generated from this definition.
 */
import { z } from 'zod';
import { Point, Units } from '../building/definition.js';

export const DemandKind = z.enum([
  'level',
  'diaphragm-span',
  'opening',
  'transfer-diaphragm',
  'strut',
  'collector',
  'wall-line',
  'pier',
  'support',
]);

export const Quantity = z.enum([
  'force',
  'diaphragm-force',
  'storey-shear',
  'overturning-moment',
  'drift',
  'centre-of-mass-x',
  'centre-of-mass-y',
  'centre-of-rigidity-x',
  'centre-of-rigidity-y',
  'torsion',
  'torsional-ratio',
  'torsional-amplification',
  'shear',
  'unit-shear',
  'net-unit-shear',
  'moment',
  'chord-force',
  'secondary-moment',
  'corner-force',
  'axial-tension',
  'axial-compression',
  'design-tension',
  'design-compression',
  'connection-force',
  'reaction',
  'end-tension',
  'end-compression',
  'deflection',
  'deflection-ratio',
  'ratio',
  'hold-down-ratio',
  'uplift',
  'bearing',
]);

export const Sense = z.union([z.literal(1), z.literal(-1)]);

export const Demand = z.strictObject({
  member: z.string().describe('Key of the member, such as `1/L2/1a`'),
  kind: DemandKind,
  quantity: Quantity,
  case: z
    .string()
    .describe('Load case or sub-case (`EX`, `EX/+e`); `gravity` with gravity alone; D, L, Lr, S for components'),
  sense: Sense.describe('1 along the case’s direction, -1 against it'),
  combination: z.string().optional().describe('Absent for the unfactored component'),
  value: z.number(),
  unit: z.string(),
  at: Point.optional().describe('Place on plan where the value occurs [length]'),
  governs: z.string().optional().describe('The rule that governed it, where several compete'),
});

export const SpanPiece = z.strictObject({
  from: z.number().describe('s at the start of the piece [length]'),
  to: z.number().describe('s at its end [length]'),
  load: z.array(z.number()).describe('w [force/length]; coefficients of (s − from)⁰, (s − from)¹ …, as in all below'),
  shear: z.array(z.number()).describe('V [force]'),
  moment: z.array(z.number()).describe('M [force·length]'),
  depth: z.array(z.number()).describe('Net depth d [length]'),
  chordDepth: z.array(z.number()).describe('Chord depth D [length]'),
});

export const DiaphragmDiagram = z.strictObject({
  kind: z.literal('diaphragm'),
  member: z.string().describe('`level/diaphragm`'),
  level: z.string(),
  case: z.string(),
  along: Point.describe('Unit vector t along the load'),
  across: Point.describe('Unit vector s across the load'),
  lines: z.array(
    z.strictObject({
      line: z.string(),
      s: z.number(),
      reaction: z.number().describe('Into the wall line, along t [force]'),
    }),
  ),
  spans: z.array(z.strictObject({ member: z.string(), from: z.number(), to: z.number() })),
  pieces: z.array(SpanPiece),
});

export const CollectorDiagram = z.strictObject({
  kind: z.literal('collector'),
  member: z.string().describe('`level/line`'),
  level: z.string(),
  line: z.string(),
  case: z.string(),
  points: z
    .array(z.strictObject({ at: z.number(), axial: z.number() }))
    .describe('Axial force, tension positive, linear between points; `at` is the distance along the line’s axis'),
});

export const StrutDiagram = z.strictObject({
  kind: z.literal('strut'),
  member: z
    .string()
    .describe('`level/diaphragm/corner/strut`, `drag` along the step or `end` along the end of a transfer diaphragm'),
  level: z.string(),
  case: z.string(),
  from: Point.describe('On plan [length]'),
  to: Point,
  points: z
    .array(z.strictObject({ at: z.number(), axial: z.number() }))
    .describe('Axial force, tension positive, linear between points; `at` is the distance from `from` towards `to`'),
});

export const TransferDiagram = z.strictObject({
  kind: z.literal('transfer-diaphragm'),
  member: z.string().describe('`level/diaphragm/corner`'),
  level: z.string(),
  case: z.string(),
  along: Point.describe('Unit vector t along the load'),
  across: Point.describe('Unit vector s across the load'),
  step: z.number().describe('s of the step [length]'),
  end: z.number().describe('s of the end away from it [length]'),
  chords: z
    .array(
      z.strictObject({
        corner: z.number().describe('Corner of the outline where the chord ends, counted from 1'),
        t: z.number(),
        axial: z.number().describe('At the step, tension positive [force]'),
      }),
    )
    .describe('The interrupted chords that it takes'),
  edges: z
    .array(z.strictObject({ t: z.number().describe('At the step [length]'), axial: z.number() }))
    .describe('What its edges take of the chords at the step, lower and upper in t, tension positive [force]'),
  panels: z
    .array(
      z.strictObject({
        from: z.number().describe('s at the start [length]'),
        to: z.number(),
        lower: z.array(z.number()).describe('t of its edges, as coefficients of (s − from) [length]'),
        upper: z.array(z.number()),
        shear: z
          .array(z.number())
          .describe('Over `depth` the net unit shear: V/d with what the interrupted chords give off [force]'),
        depth: z.array(z.number()).describe('Net depth d of the whole cut [length]'),
      }),
    )
    .describe('The floor between edges and interrupted chords, piece by piece'),
});

const StripEdge = z.strictObject({
  t: z.number().describe('At the middle of the opening [length]'),
  axial: z.number().describe('Tension positive, in sense 1 [force]'),
});

export const OpeningDiagram = z.strictObject({
  kind: z.literal('opening'),
  member: z.string().describe('`level/diaphragm/opening`'),
  level: z.string(),
  case: z.string(),
  along: Point.describe('Unit vector t along the cuts'),
  across: Point.describe('Unit vector s across them'),
  ends: z
    .array(
      z.strictObject({
        s: z.number().describe('Side of the opening [length]'),
        lower: StripEdge,
        upper: StripEdge,
        moment: z.number().describe('Of the strip alone, none at the middle of the opening [force·length]'),
      }),
    )
    .describe('Every strip beside the opening at both sides of it: the forces at the corners with their signs'),
});

export const Diagram = z.discriminatedUnion('kind', [
  DiaphragmDiagram,
  CollectorDiagram,
  StrutDiagram,
  TransferDiagram,
  OpeningDiagram,
]);

export const PathNode = z.strictObject({
  id: z.string(),
  kind: z.enum(['mass', 'diaphragm-span', 'collector', 'wall-line', 'pier', 'end-post', 'support']),
  member: z.string(),
  level: z.string().describe('The level, or the level above the storey, where the member stands'),
});

export const PathEdge = z.strictObject({
  from: z.string(),
  to: z.string(),
  case: z.string(),
  force: z.number().describe('For sense 1 [force]; horizontal along the receiving line’s axis, vertical downwards'),
  acts: z.enum(['horizontal', 'vertical']),
});

export const Finding = z.strictObject({
  code: z.string(),
  severity: z.enum(['note', 'warning', 'open-end']),
  member: z.string(),
  sentence: z.string(),
  case: z.string().optional(),
  numbers: z.record(z.string(), z.number()).optional().describe('The numbers that decided it'),
});

export const Residual = z.strictObject({ what: z.string(), residual: z.number() });

export const Certificate = z.strictObject({
  worstResidual: z.number().describe('Largest equilibrium residual relative to the forces involved'),
  bound: z.number(),
  worst: z.string().describe('Where it occurs'),
  checks: z.array(Residual).describe('The largest residual of each kind of check'),
});

export const Analysis = z
  .strictObject({
    schema: z.literal('groundward.analysis/1'),
    units: Units,
    demands: z.array(Demand),
    diagrams: z.array(Diagram),
    path: z.strictObject({ nodes: z.array(PathNode), edges: z.array(PathEdge) }),
    findings: z.array(Finding),
    certificate: Certificate,
  })
  .meta({ id: 'groundward.analysis/1', title: 'Groundward analysis' });

export type DemandKind = z.infer<typeof DemandKind>;
export type Quantity = z.infer<typeof Quantity>;
export type Sense = z.infer<typeof Sense>;
export type Demand = z.infer<typeof Demand>;
export type SpanPiece = z.infer<typeof SpanPiece>;
export type DiaphragmDiagram = z.infer<typeof DiaphragmDiagram>;
export type CollectorDiagram = z.infer<typeof CollectorDiagram>;
export type StrutDiagram = z.infer<typeof StrutDiagram>;
export type TransferDiagram = z.infer<typeof TransferDiagram>;
export type OpeningDiagram = z.infer<typeof OpeningDiagram>;
export type Diagram = z.infer<typeof Diagram>;
export type PathNode = z.infer<typeof PathNode>;
export type PathEdge = z.infer<typeof PathEdge>;
export type Finding = z.infer<typeof Finding>;
export type Certificate = z.infer<typeof Certificate>;
export type Analysis = z.infer<typeof Analysis>;
