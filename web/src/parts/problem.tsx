import { faultSentence } from '@groundward/engine/building/fault';
import { ApiProblem } from '@/lib/api';

/** What went wrong, with every fault in its own sentence. */
export function ProblemView({ error }: { readonly error: unknown }) {
  if (error === null || error === undefined) return null;
  const faults = error instanceof ApiProblem ? error.faults : [];
  return (
    <div className="problem" role="alert">
      {error instanceof Error ? error.message : 'Something failed.'}
      {faults.length > 0 && (
        <ul>
          {faults.map((fault, i) => (
            <li key={i}>{faultSentence(fault)}</li>
          ))}
        </ul>
      )}
    </div>
  );
}

/** Loading, failed or there. */
export function Pending({ error, what }: { readonly error: unknown; readonly what: string }) {
  return error === null || error === undefined ? (
    <p className="note">Reading {what} …</p>
  ) : (
    <ProblemView error={error} />
  );
}
