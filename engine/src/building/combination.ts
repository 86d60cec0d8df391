/** Load combinations: a published set by name, or a list of the file's own. */
import { z } from 'zod';
import { TEXT } from './values.js';

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

export const PublishedSet = z.enum([
  'ASCE 7-16 allowable',
  'ASCE 7-16 strength',
  'ASCE 7-22 allowable',
  'ASCE 7-22 strength',
  'EN 1990',
]);

export const Combinations = z
  .union([PublishedSet, z.array(Combination).max(500)])
  .describe(
    'A published set by name, or a list; default none, which leaves the unfactored components. The sets of ASCE 7-22 take S from a ground snow load of strength level, as that edition maps it.',
  );

export type Combination = z.infer<typeof Combination>;
export type PublishedSet = z.infer<typeof PublishedSet>;
export type Combinations = z.infer<typeof Combinations>;
