import { createHash } from 'node:crypto';
import { canonicalBuilding } from '@groundward/engine/building/canonical';
import type { Building } from '@groundward/engine/building/definition';

/** SHA-256 over the building's canonical text, in hexadecimal. */
export function hashOf(building: Building): string {
  return createHash('sha256').update(canonicalBuilding(building)).digest('hex');
}
