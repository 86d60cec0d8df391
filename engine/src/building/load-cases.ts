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

export const LoadCase = z.discriminatedUnion('from', [StatedCase, BasisCase]);

export type LoadCase = z.infer<typeof LoadCase>;
export type StatedCase = z.infer<typeof StatedCase>;
