/** How a working names a demand: `member quantity case sense`, with the combination behind it where there is one. */
import type { Demand } from '../path/result.js';

export type DemandKey = Pick<Demand, 'member' | 'quantity' | 'case' | 'sense' | 'combination'>;

export function referenceOf({ member, quantity, case: caseId, sense, combination }: DemandKey): string {
  const head = `${member} ${quantity} ${caseId} ${sense}`;
  return combination === undefined ? head : `${head} ${combination}`;
}
