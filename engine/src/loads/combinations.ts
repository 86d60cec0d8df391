/** Load combinations as factors on components. */
import type { Building, GravityCase } from '../building/definition.js';

export type FactoredCombination = {
  readonly id: string;
  readonly applies: 'gravity' | 'seismic' | 'wind';
  /** With ±0.2·S_DS on D where a published set meets a basis that states it. */
  readonly gravity: Readonly<Record<GravityCase, number>>;
  /** On the lateral case's own effect; with ρ in the published sets. */
  readonly lateral: number;
};

type Term = { readonly D?: number; readonly L?: number; readonly Lr?: number; readonly S?: number };
type Published = {
  readonly id: string;
  readonly applies: FactoredCombination['applies'];
  readonly gravity: Term;
  readonly lateral: number;
  /** Factor on E_v = 0.2·S_DS·D. */
  readonly vertical?: number;
};

// ASCE 7-16 and 7-22 2.4.1 and 2.4.5; from memory, not checked against the document.
const ALLOWABLE: readonly Published[] = [
  { id: 'D', applies: 'gravity', gravity: { D: 1 }, lateral: 0 },
  { id: 'D+L', applies: 'gravity', gravity: { D: 1, L: 1 }, lateral: 0 },
  { id: 'D+Lr', applies: 'gravity', gravity: { D: 1, Lr: 1 }, lateral: 0 },
  { id: 'D+S', applies: 'gravity', gravity: { D: 1, S: 1 }, lateral: 0 },
  { id: 'D+0.75L+0.75Lr', applies: 'gravity', gravity: { D: 1, L: 0.75, Lr: 0.75 }, lateral: 0 },
  { id: 'D+0.75L+0.75S', applies: 'gravity', gravity: { D: 1, L: 0.75, S: 0.75 }, lateral: 0 },
  { id: 'D+0.6W', applies: 'wind', gravity: { D: 1 }, lateral: 0.6 },
  { id: 'D+0.45W+0.75L+0.75Lr', applies: 'wind', gravity: { D: 1, L: 0.75, Lr: 0.75 }, lateral: 0.45 },
  { id: 'D+0.45W+0.75L+0.75S', applies: 'wind', gravity: { D: 1, L: 0.75, S: 0.75 }, lateral: 0.45 },
  { id: '0.6D+0.6W', applies: 'wind', gravity: { D: 0.6 }, lateral: 0.6 },
  { id: 'D+0.7E', applies: 'seismic', gravity: { D: 1 }, lateral: 0.7, vertical: 0.7 },
  {
    id: 'D+0.525E+0.75L+0.75S',
    applies: 'seismic',
    gravity: { D: 1, L: 0.75, S: 0.75 },
    lateral: 0.525,
    vertical: 0.525,
  },
  { id: '0.6D+0.7E', applies: 'seismic', gravity: { D: 0.6 }, lateral: 0.7, vertical: -0.7 },
];

/** @param snow factor on S beside E. 0.2 in ASCE 7-16 2.3.6, 0.15 in 7-22; from memory, not checked against the document. */
function strength(snow: number): readonly Published[] {
  // ASCE 7-16 and 7-22 2.3.1 and 2.3.6; from memory, not checked against the document.
  const roof = snow === 0.2 ? { S: 1.6, companion: 0.5 } : { S: 1, companion: 0.3 };
  return [
    { id: '1.4D', applies: 'gravity', gravity: { D: 1.4 }, lateral: 0 },
    { id: '1.2D+1.6L+0.5Lr', applies: 'gravity', gravity: { D: 1.2, L: 1.6, Lr: 0.5 }, lateral: 0 },
    {
      id: `1.2D+1.6L+${roof.companion}S`,
      applies: 'gravity',
      gravity: { D: 1.2, L: 1.6, S: roof.companion },
      lateral: 0,
    },
    { id: '1.2D+1.6Lr+L', applies: 'gravity', gravity: { D: 1.2, L: 1, Lr: 1.6 }, lateral: 0 },
    { id: `1.2D+${roof.S}S+L`, applies: 'gravity', gravity: { D: 1.2, L: 1, S: roof.S }, lateral: 0 },
    { id: '1.2D+W+L+0.5Lr', applies: 'wind', gravity: { D: 1.2, L: 1, Lr: 0.5 }, lateral: 1 },
    { id: `1.2D+W+L+${roof.companion}S`, applies: 'wind', gravity: { D: 1.2, L: 1, S: roof.companion }, lateral: 1 },
    { id: '0.9D+W', applies: 'wind', gravity: { D: 0.9 }, lateral: 1 },
    { id: `1.2D+E+L+${snow}S`, applies: 'seismic', gravity: { D: 1.2, L: 1, S: snow }, lateral: 1, vertical: 1 },
    { id: '0.9D+E', applies: 'seismic', gravity: { D: 0.9 }, lateral: 1, vertical: -1 },
  ];
}

/**
 * The combinations that the building names or lists. In a published set E = ρ·Q_E ± 0.2·S_DS·D (ASCE 7-16 12.4.2), with S_DS and ρ
 * of the basis; a list of the file's own is taken literally.
 */
export function combinationsOf(building: Building): readonly FactoredCombination[] {
  const named = building.combinations;
  if (named === undefined) return [];
  if (typeof named !== 'string') {
    return named.map(({ id, factors }) => ({
      id,
      applies: factors.E !== undefined ? 'seismic' : factors.W !== undefined ? 'wind' : 'gravity',
      gravity: { D: factors.D ?? 0, L: factors.L ?? 0, Lr: factors.Lr ?? 0, S: factors.S ?? 0 },
      lateral: factors.E ?? factors.W ?? 0,
    }));
  }
  const seismic = building.basis?.seismic;
  const sets = {
    'ASCE 7-16 allowable': ALLOWABLE,
    'ASCE 7-22 allowable': ALLOWABLE,
    'ASCE 7-16 strength': strength(0.2),
    'ASCE 7-22 strength': strength(0.15),
  };
  return sets[named].map(({ id, applies, gravity, lateral, vertical = 0 }) => ({
    id,
    applies,
    gravity: {
      D: (gravity.D ?? 0) + vertical * 0.2 * (seismic?.SDS ?? 0), // ASCE 7-16 Eq. 12.4-4a
      L: gravity.L ?? 0,
      Lr: gravity.Lr ?? 0,
      S: gravity.S ?? 0,
    },
    lateral: applies === 'seismic' ? lateral * (seismic?.redundancy ?? 1) : lateral, // ASCE 7-16 Eq. 12.4-3
  }));
}
