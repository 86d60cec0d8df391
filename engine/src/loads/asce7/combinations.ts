/** The load combinations of ASCE 7-16 and 7-22. */
import type { AsceSeismic } from '../../building/basis.js';
import type { FactoredCombination } from '../combinations.js';

type Term = { readonly D?: number; readonly L?: number; readonly Lr?: number; readonly S?: number };
export type Published = {
  readonly id: string;
  readonly applies: FactoredCombination['applies'];
  readonly gravity: Term;
  readonly lateral: number;
  /** Factor on E_v = 0.2·S_DS·D. */
  readonly vertical?: number;
};

export type AsceSet = keyof typeof SETS;

/**
 * A published set with E = ρ·Q_E ± 0.2·S_DS·D (ASCE 7-16 12.4.2), with S_DS and ρ of the basis.
 *
 * @param seismic without it there is no vertical effect and ρ is 1
 */
export function asceCombinations(set: AsceSet, seismic: AsceSeismic | undefined): readonly FactoredCombination[] {
  return SETS[set].map(({ id, applies, gravity, lateral, vertical = 0 }) => ({
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

/**
 * The set's seismic combinations with overstrength, E_m = Ω₀·Q_E ± 0.2·S_DS·D: `0.6D+0.7Em`, `1.2D+Em+L+0.2S`.
 *
 * Source: ASCE 7-16 12.4.3, 2.3.6 and 2.4.5; from memory, not checked against the document.
 */
export function overstrengthCombinations(
  set: AsceSet,
  seismic: AsceSeismic,
  overstrength: number,
): readonly FactoredCombination[] {
  return asceCombinations(set, { ...seismic, redundancy: 1 }) // ASCE 7-16 12.3.4.1: ρ = 1 where Ω₀ is used
    .filter(({ applies }) => applies === 'seismic')
    .map((combination) => ({
      ...combination,
      id: withOverstrength(combination.id),
      lateral: combination.lateral * overstrength, // ASCE 7-16 Eq. 12.4-7
    }));
}

/** `0.6D+0.7E` → `0.6D+0.7Em` */
function withOverstrength(id: string): string {
  return id.replace(/E(?=\+|$)/, 'Em');
}

/** The terms of a published combination, or of its form with overstrength, before a basis of design enters. */
export function publishedTerms(set: AsceSet, id: string): Published | undefined {
  return SETS[set].find((candidate) => candidate.id === id || withOverstrength(candidate.id) === id);
}

/** A factor as it stands in an id: 1 is not written. */
const times = (factor: number): string => (factor === 1 ? '' : String(factor));

/** How snow enters: alone, beside another transient load, beside earthquake. In 7-22 the ground snow load is one of strength level. */
type Snow = { readonly alone: number; readonly beside: number; readonly seismic: number };

/** ASCE 7-16 and 7-22 2.4.1 and 2.4.5; from memory, not checked against the documents. */
function allowable({ alone, beside, seismic }: Snow): readonly Published[] {
  const gravityBeside = { D: 1, L: 0.75 };
  return [
    { id: 'D', applies: 'gravity', gravity: { D: 1 }, lateral: 0 },
    { id: 'D+L', applies: 'gravity', gravity: { D: 1, L: 1 }, lateral: 0 },
    { id: 'D+Lr', applies: 'gravity', gravity: { D: 1, Lr: 1 }, lateral: 0 },
    { id: `D+${times(alone)}S`, applies: 'gravity', gravity: { D: 1, S: alone }, lateral: 0 },
    { id: 'D+0.75L+0.75Lr', applies: 'gravity', gravity: { ...gravityBeside, Lr: 0.75 }, lateral: 0 },
    { id: `D+0.75L+${beside}S`, applies: 'gravity', gravity: { ...gravityBeside, S: beside }, lateral: 0 },
    { id: 'D+0.6W', applies: 'wind', gravity: { D: 1 }, lateral: 0.6 },
    { id: 'D+0.45W+0.75L+0.75Lr', applies: 'wind', gravity: { ...gravityBeside, Lr: 0.75 }, lateral: 0.45 },
    { id: `D+0.45W+0.75L+${beside}S`, applies: 'wind', gravity: { ...gravityBeside, S: beside }, lateral: 0.45 },
    { id: '0.6D+0.6W', applies: 'wind', gravity: { D: 0.6 }, lateral: 0.6 },
    { id: 'D+0.7E', applies: 'seismic', gravity: { D: 1 }, lateral: 0.7, vertical: 0.7 },
    {
      id: `D+0.525E+0.75L+${seismic}S`,
      applies: 'seismic',
      gravity: { ...gravityBeside, S: seismic },
      lateral: 0.525,
      vertical: 0.525,
    },
    { id: '0.6D+0.7E', applies: 'seismic', gravity: { D: 0.6 }, lateral: 0.7, vertical: -0.7 },
  ];
}

/** ASCE 7-16 and 7-22 2.3.1 and 2.3.6; from memory, not checked against the documents. */
function strength({ alone, beside, seismic }: Snow): readonly Published[] {
  return [
    { id: '1.4D', applies: 'gravity', gravity: { D: 1.4 }, lateral: 0 },
    { id: '1.2D+1.6L+0.5Lr', applies: 'gravity', gravity: { D: 1.2, L: 1.6, Lr: 0.5 }, lateral: 0 },
    { id: `1.2D+1.6L+${beside}S`, applies: 'gravity', gravity: { D: 1.2, L: 1.6, S: beside }, lateral: 0 },
    { id: '1.2D+1.6Lr+L', applies: 'gravity', gravity: { D: 1.2, L: 1, Lr: 1.6 }, lateral: 0 },
    { id: `1.2D+${times(alone)}S+L`, applies: 'gravity', gravity: { D: 1.2, L: 1, S: alone }, lateral: 0 },
    { id: '1.2D+1.6Lr+0.5W', applies: 'wind', gravity: { D: 1.2, Lr: 1.6 }, lateral: 0.5 },
    { id: `1.2D+${times(alone)}S+0.5W`, applies: 'wind', gravity: { D: 1.2, S: alone }, lateral: 0.5 },
    { id: '1.2D+W+L+0.5Lr', applies: 'wind', gravity: { D: 1.2, L: 1, Lr: 0.5 }, lateral: 1 },
    { id: `1.2D+W+L+${beside}S`, applies: 'wind', gravity: { D: 1.2, L: 1, S: beside }, lateral: 1 },
    { id: '0.9D+W', applies: 'wind', gravity: { D: 0.9 }, lateral: 1 },
    { id: `1.2D+E+L+${seismic}S`, applies: 'seismic', gravity: { D: 1.2, L: 1, S: seismic }, lateral: 1, vertical: 1 },
    { id: '0.9D+E', applies: 'seismic', gravity: { D: 0.9 }, lateral: 1, vertical: -1 },
  ];
}

/** From memory, not checked against the documents. */
const SETS = {
  'ASCE 7-16 allowable': allowable({ alone: 1, beside: 0.75, seismic: 0.75 }),
  'ASCE 7-22 allowable': allowable({ alone: 0.7, beside: 0.525, seismic: 0.1 }),
  'ASCE 7-16 strength': strength({ alone: 1.6, beside: 0.5, seismic: 0.2 }),
  'ASCE 7-22 strength': strength({ alone: 1, beside: 0.3, seismic: 0.15 }),
};
