import { faultSentence } from '@groundward/engine/building/fault';
import { ApiProblem } from '@/lib/api';

/** What went wrong, with every fault in its own sentence; `onGo` leads to a fault's place in the building file. */
export function ProblemView({ error, onGo }: { readonly error: unknown; readonly onGo?: (path: string) => void }) {
  if (error === null || error === undefined) return null;
  const faults = error instanceof ApiProblem ? error.faults : [];
  return (
    <div className="problem" role="alert">
      {error instanceof Error ? error.message : 'Something failed.'}
      {faults.length > 0 && (
        <ul>
          {faults.map((fault, i) => (
            <li key={i}>
              {faultSentence(fault)}{' '}
              {onGo !== undefined && fault.path !== '' && (
                <button className="quiet" onClick={() => onGo(fault.path)}>
                  go there
                </button>
              )}
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}

/** Loading, or failed. */
export function Pending({ error, what }: { readonly error: unknown; readonly what: string }) {
  return error === null || error === undefined ? (
    <p className="note" role="status">
      Reading {what} …
    </p>
  ) : (
    <ProblemView error={error} />
  );
}
