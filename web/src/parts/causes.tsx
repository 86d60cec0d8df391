import type { Change, Edit } from '@groundward/engine/compare/result';
import { quantity, withSign } from '@/lib/format';

/** So many shares stand in a row; the rest is told together. */
const SHOWN = 3;

/** The share of each edit in a change, the largest first: a bar to the right adds, one to the left takes away. */
export function Causes({ change, edits }: { readonly change: Change; readonly edits: readonly Edit[] }) {
  const causes = [...change.causes].sort((a, b) => Math.abs(b.share) - Math.abs(a.share));
  const most = Math.abs(causes[0]?.share ?? 0);
  // A force that acts against its positive sense grows when its share is negative.
  const turn = (change.after ?? change.before ?? 0) < 0 ? -1 : 1;
  return (
    <ul className="plain causes">
      {causes.slice(0, SHOWN).map(({ edit, share, error }) => {
        const value = share * turn;
        const half = most === 0 ? 0 : (Math.abs(value) / most) * 50;
        return (
          <li key={edit} title={edits.find(({ id }) => id === edit)?.what}>
            <span className="bar-of-share" aria-hidden>
              <span
                className={value < 0 ? 'lowers' : 'raises'}
                style={{ width: `${half}%`, left: value < 0 ? `${50 - half}%` : '50%' }}
              />
            </span>
            {` ${edit} ${withSign(quantity(value, change.unit), value)}`}
            {error !== undefined && ` ± ${quantity(error, change.unit)}`}
          </li>
        );
      })}
      {causes.length > SHOWN && <li className="note">{`and ${causes.length - SHOWN} more`}</li>}
    </ul>
  );
}
