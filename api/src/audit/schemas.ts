import { z } from 'zod';

export const AuditQuery = z.object({
  before: z
    .string()
    .regex(/^\d{1,18}$/)
    .optional()
    .describe('Entries before this one; default from the latest'),
  limit: z.coerce.number().int().min(1).max(500).optional().describe('Default 100'),
});

export const AuditPage = z.object({
  entries: z.array(
    z.object({
      id: z.string(),
      at: z.string(),
      by: z.string().nullable().describe('null where it was written outside the service'),
      what: z.string(),
    }),
  ),
  next: z.string().nullable(),
});
export type AuditPage = z.infer<typeof AuditPage>;
