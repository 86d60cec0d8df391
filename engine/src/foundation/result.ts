/** The foundation demands, `groundward.foundation/1`: what arrives at every support. */
import type { Point, Units } from '../building/definition.js';
import type { Sense } from '../path/result.js';

export type SupportQuantity = 'shear' | 'uplift' | 'bearing' | 'moment';

export type SupportDemand = {
  readonly quantity: SupportQuantity;
  readonly case: string;
  readonly sense: Sense;
  /** Absent for the unfactored component. */
  readonly combination?: string;
  /** Magnitude [force], moment [force·length] */
  readonly value: number;
  readonly unit: string;
  /** The largest of its quantity at this support among the combinations (among the components where none is named). */
  readonly governing: boolean;
};

export type Support = {
  /** `line/pier` for a pier's foot, `line/pier/from` for its end post, `line/under/pier/from` for a post carried down. */
  readonly member: string;
  /** Short label on plan and schedule, in order of line and place: `F1`, `F2` … */
  readonly label: string;
  readonly line: string;
  readonly at: Point;
  readonly demands: readonly SupportDemand[];
};

export type FoundationTotal = {
  readonly case: string;
  readonly sense: Sense;
  /** Σ horizontal along x and y [force] */
  readonly fx: number;
  readonly fy: number;
  /** Σ vertical, downwards [force] */
  readonly fz: number;
  /** Σ moment about the origin: overturning about x and y, torsion about z [force·length] */
  readonly mx: number;
  readonly my: number;
  readonly mz: number;
};

export type Foundation = {
  readonly schema: 'groundward.foundation/1';
  readonly units: Units;
  readonly building: string;
  readonly supports: readonly Support[];
  readonly totals: readonly FoundationTotal[];
};
