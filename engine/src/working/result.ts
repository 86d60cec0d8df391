/**
 * The working behind one demand, `groundward.working/1`: steps that a checker can follow with a pocket calculator. The JSON Schema of a
 * working is generated from this definition.
 */
import { z } from 'zod';
import { Units } from '../building/definition.js';
import { Demand } from '../path/result.js';

const Shown = z
  .string()
  .describe('As it is printed: with the digits from which the printed result follows by the formula');

export const WorkingValue = z.strictObject({
  symbol: z.string(),
  value: z.number(),
  shown: Shown,
  unit: z.string(),
  what: z.string().optional().describe('What it is, where the symbol alone does not say'),
  from: z
    .string()
    .optional()
    .describe(
      'Where it comes from: the symbol of an earlier step; a demand, `member quantity case sense` with its combination behind it where there is one; a path into the building file, such as `levels[1].elevation`, where a number stands, or where the drawing or the solution stands from which the value was read; or `default` and the path of what the file leaves out',
    ),
});

export const WorkingStep = z.strictObject({
  symbol: z.string(),
  what: z.string().optional().describe('What the step finds'),
  formula: z
    .string()
    .describe('`symbol = expression` in the symbols of `values`, with + − · / ^ ( ) and abs, max, min, sqrt'),
  values: z.array(WorkingValue),
  result: z.number(),
  shown: Shown,
  unit: z.string(),
  clause: z.string().optional().describe('Clause of a standard, or the law'),
});

export const Working = z
  .strictObject({
    schema: z.literal('groundward.working/1'),
    units: Units,
    demand: Demand,
    steps: z.array(WorkingStep).min(1).describe('The last step gives the demand'),
  })
  .meta({ id: 'groundward.working/1', title: 'Groundward working' });

export type WorkingValue = z.infer<typeof WorkingValue>;
export type WorkingStep = z.infer<typeof WorkingStep>;
export type Working = z.infer<typeof Working>;
