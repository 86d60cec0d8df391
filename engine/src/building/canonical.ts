/** The canonical text of a building, from which its hash is made. */
import canonicalize from 'canonicalize';
import type { Building } from './definition.js';

/**
 * @returns the building as RFC 8785 canonical JSON: the same text for the same building, whatever the order of keys in its file
 */
export function canonicalBuilding(building: Building): string {
  const text = canonicalize(building);
  if (text === undefined) throw new TypeError('a building has no canonical text');
  return text;
}
