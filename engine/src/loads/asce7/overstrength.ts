/** The overstrength factor of ASCE 7-16 and 7-22 and the set of rules that hang on the seismic design category. */
import type { AsceSeismic } from '../../building/basis.js';

export type DesignCategory = NonNullable<AsceSeismic['designCategory']>;

/** What the standard asks for beyond the forces themselves, for one basis and one building. */
export type SeismicRules = {
  readonly category: DesignCategory;
  /** Ω₀, reduced where the basis asks for it and every diaphragm is flexible. */
  readonly overstrength: number;
  /** ρ on storey forces and on transfer forces; 1 in categories B and C (12.3.4.1). */
  readonly redundancy: number;
  /** Whether collectors take Ω₀ (12.10.2.1): categories C to F, but not what light-frame walls alone brace. */
  readonly collectors: boolean;
  /** Factor of 12.3.3.4 on connections of diaphragms and on collectors without Ω₀: 1.25 or 1. */
  readonly connections: number;
  /** Irregularities that ask for it, as the standard's tables number them. */
  readonly irregularities: readonly string[];
};

/** What of the building the rules depend on. */
export type Standing = {
  readonly allFlexible: boolean;
  readonly irregularities: readonly string[];
};

/**
 * @returns undefined where the basis states no design category, or category A, to which none of the rules apply
 * Source: ASCE 7-16 12.3.3.4, 12.3.4, 12.10.2.1 (the same in 7-22); from memory, not checked against the document.
 */
export function seismicRules(basis: AsceSeismic, standing: Standing): SeismicRules | undefined {
  const category = basis.designCategory;
  if (category === undefined || category === 'A') return undefined;
  const high = category !== 'B' && category !== 'C';
  const connections = high && standing.irregularities.length > 0 ? 1.25 : 1; // ASCE 7-16 12.3.3.4
  return {
    category,
    overstrength: overstrengthFactor(basis, standing.allFlexible),
    redundancy: high ? (basis.redundancy ?? 1) : 1, // ASCE 7-16 12.3.4.1, 12.3.4.2
    collectors: category !== 'B' && basis.lightFrame !== true, // ASCE 7-16 12.10.2.1
    connections,
    irregularities: standing.irregularities,
  };
}

/**
 * Ω₀. Where it is 2.5 or more it may be taken less 0.5 with flexible diaphragms.
 *
 * Source: ASCE 7-16 Table 12.2-1, footnote b; from memory, not checked against the document.
 */
export function overstrengthFactor(
  basis: Pick<AsceSeismic, 'overstrength' | 'reduceOverstrength'>,
  allFlexible: boolean,
): number {
  const stated = basis.overstrength ?? 1;
  return basis.reduceOverstrength === true && allFlexible && stated >= 2.5 ? stated - 0.5 : stated;
}
