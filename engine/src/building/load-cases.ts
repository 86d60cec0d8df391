/** Load cases: which way, and where the level forces come from. */
import { z } from 'zod';
import { Id, ID, LIMIT, Name } from './values.js';

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
  basis: Id.optional().describe('The basis of design of this case, one of `bases`; default the file’s `basis`'),
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
  kind: z
    .enum(['seismic', 'wind'])
    .describe(
      'Wind from a basis lies along the façade and makes its torsional sub-cases itself: no spread, no accidental',
    ),
  from: z.literal('basis'),
});

export const CombinedPart = z.strictObject({
  case: caseHead.id.describe('A load case of the file that has its own forces'),
  factor: z.number().min(-10).max(10).describe('Factor on its effects, not 0'),
});

/** EN 1998-1 4.3.3.5.1(3), E_x “+” 0.3 E_y; ASCE 7-16 12.5.3, 100 % and 30 %; Fig. 27.3-8, cases 3 and 4. */
export const CombinedCase = z
  .strictObject({
    id: caseHead.id,
    name: Name.optional(),
    basis: Id.optional().describe('The basis whose combinations it enters; default that of its first part'),
    kind: z.enum(['seismic', 'wind']),
    from: z.literal('combined'),
    parts: z.array(CombinedPart).min(2).max(3),
  })
  .describe(
    'Load cases that act together: walls, posts and supports with every combination of their signs and eccentricities',
  );

export const LoadCase = z.discriminatedUnion('from', [StatedCase, BasisCase, CombinedCase]);

export type LoadCase = z.infer<typeof LoadCase>;
export type StatedCase = z.infer<typeof StatedCase>;
export type CombinedCase = z.infer<typeof CombinedCase>;
/** A load case with forces of its own. */
export type PlainCase = Exclude<LoadCase, CombinedCase>;
