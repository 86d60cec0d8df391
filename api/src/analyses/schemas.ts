import { Demand, DemandKind, Quantity } from '@groundward/engine/path/result';
import { Units } from '@groundward/engine/building/definition';
import { z } from 'zod';
import { line } from '../http/text.js';

export const DemandQuery = z.object({
  member: line(300).optional(),
  kind: DemandKind.optional(),
  quantity: Quantity.optional(),
  level: line(64).optional(),
  case: line(64).optional(),
  sense: z.enum(['1', '-1']).optional(),
  combination: line(64).optional().describe('Empty for unfactored components'),
  limit: z.coerce.number().int().min(1).max(10_000).optional(),
  after: z.coerce.number().int().min(0).optional().describe('The `next` of the page before'),
});
export type DemandQuery = z.infer<typeof DemandQuery>;

export const DemandPage = z.object({ demands: z.array(Demand), next: z.number().int().nullable() });
export type DemandPage = z.infer<typeof DemandPage>;

export const TraceQuery = z.object({ member: line(300).min(1), case: line(64).min(1) });

export const WorkingQuery = z.object({
  member: line(300).min(1),
  quantity: Quantity,
  case: line(64).min(1).optional().describe('Default the case with the largest value'),
  sense: z.enum(['1', '-1']).optional().describe('Default 1'),
  combination: line(64).optional().describe('Default the unfactored component where there is one'),
});

const Part = z.object({ member: z.string(), level: z.string(), force: z.number(), share: z.number() });

export const TraceView = z.object({
  schema: z.literal('groundward.trace/1'),
  units: Units,
  member: z.string(),
  case: z.string(),
  force: z.number(),
  up: z.array(Part),
  down: z.array(Part),
});
