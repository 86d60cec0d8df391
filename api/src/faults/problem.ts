/** Problems as the service answers them: RFC 9457, with the engine's faults where the engine found them. */
import type { Fault } from '@groundward/engine/building/fault';
import { z } from 'zod';

export const ProblemDocument = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  instance: z.string(),
  code: z.string().describe('The same codes as the engine’s faults'),
  faults: z
    .array(
      z.object({
        code: z.string(),
        path: z.string(),
        found: z.string(),
        expected: z.string(),
        hint: z.string().optional(),
      }),
    )
    .optional(),
  current: z.unknown().optional().describe('With 412: what is saved now'),
});

export type ProblemDocument = z.infer<typeof ProblemDocument>;

export class Problem extends Error {
  readonly status: number;
  readonly code: string;
  readonly extra: { readonly faults?: readonly Fault[]; readonly current?: unknown };

  constructor(status: number, code: string, detail: string, extra: Problem['extra'] = {}) {
    super(detail);
    this.status = status;
    this.code = code;
    this.extra = extra;
  }
}

export function notFound(what: string): Problem {
  return new Problem(404, 'not-found', `There is no such ${what}, or you are not let in to it.`);
}

export function databaseDown(): Problem {
  return new Problem(503, 'database-down', 'The database does not answer.');
}

/** The engine's faults: nothing was saved. */
export function faulty(faults: readonly Fault[]): Problem {
  const first = faults[0];
  const more = faults.length > 1 ? ` and ${faults.length - 1} more` : '';
  return new Problem(
    422,
    first?.code ?? 'fault',
    `Nothing was saved: ${faults.length === 1 ? 'a fault' : `${first?.code ?? 'a fault'}${more}`} in the building.`,
    { faults },
  );
}
