/** The unit of a number in a building file, by the key under which it stands. */
import type { Units } from '../building/definition.js';

type Dimension = 'length' | 'force' | 'per-length' | 'per-area';

const DIMENSIONS: Readonly<Record<string, Dimension>> = {
  elevation: 'length',
  from: 'length',
  to: 'length',
  endOffset: 'length',
  meshSize: 'length',
  postTolerance: 'length',
  deflectionAtAllowable: 'length',
  force: 'force',
  diaphragmForce: 'force',
  allowableTension: 'force',
  chordStiffness: 'force',
  perLength: 'per-length',
  stiffness: 'per-length',
  apparentShearStiffness: 'per-length',
  axialStiffness: 'per-length',
  area: 'per-area',
};

/** @returns the unit's name; empty for what has none, such as an angle's key or a factor's */
export function unitOfKey(key: string, { length, force }: Units): string {
  const dimension = Object.hasOwn(DIMENSIONS, key) ? DIMENSIONS[key] : undefined;
  switch (dimension) {
    case 'length':
      return length;
    case 'force':
      return force;
    case 'per-length':
      return `${force}/${length}`;
    case 'per-area':
      return `${force}/${length}²`;
    case undefined:
      return '';
  }
}
