/** The values that every part of the building file is made of: identities, names, coordinates, weights, outlines. */
import { z } from 'zod';

export const LIMIT = 1e9;

// Half a character pair and the zero character cannot be kept by every database and every program.
export const ID = /^[^\s/\p{Cc}\p{Cs}]+$/u;
export const TEXT = /^[^\p{Cc}\p{Cs}]*$/u;

export const Id = z
  .string()
  .min(1)
  .max(64)
  .regex(ID, 'an id without white space, control characters and "/"')
  .describe('Identity for life: goes from revision to revision with its member; unique in its collection.');
export const Name = z.string().min(1).max(200).regex(TEXT, 'text without control characters');
export const Coordinate = z.number().min(-LIMIT).max(LIMIT);
export const Weight = z.number().nonnegative().max(LIMIT);
export const Positive = z.number().positive().max(LIMIT);

export const Point = z.tuple([Coordinate, Coordinate]).describe('[x, y] on plan [length]');
export const Ring = z
  .array(Point)
  .min(3)
  .max(2000)
  .describe('Simple polygon without a repeated last point, in either direction [length]');

export const GravityCase = z
  .enum(['D', 'L', 'Lr', 'S'])
  .describe('D dead, L live, Lr roof live, S snow: unfactored components of gravity load');

export type Id = z.infer<typeof Id>;
export type Point = z.infer<typeof Point>;
export type Ring = z.infer<typeof Ring>;
export type GravityCase = z.infer<typeof GravityCase>;
