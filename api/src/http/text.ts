/** Text in requests: without the characters that the database cannot keep. */
import { z } from 'zod';

/** One line: a name, a member's key. */
export function line(longest: number): z.ZodString {
  return z
    .string()
    .max(longest)
    .regex(/^[^\p{Cc}\p{Cs}]*$/u, 'text without control characters');
}

/** Text of several lines. */
export function prose(longest: number): z.ZodString {
  return z
    .string()
    .max(longest)
    .regex(/^(?:[^\p{Cc}\p{Cs}]|[\t\n\r])*$/u, 'text without control characters');
}
