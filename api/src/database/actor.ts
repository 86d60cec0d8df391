/** Who a request's writes are by: set when the session is known, read when a transaction begins. */
import { AsyncLocalStorage } from 'node:async_hooks';

export type Actor = { readonly id: string; readonly name: string };

const requests = new AsyncLocalStorage<{ actor: Actor | undefined }>();

/** Runs a request; what it sets as its actor holds for it alone. */
export function asRequest<T>(work: () => T): T {
  return requests.run({ actor: undefined }, work);
}

export function setActor(actor: Actor): void {
  const request = requests.getStore();
  if (request !== undefined) request.actor = actor;
}

export function actor(): Actor | undefined {
  return requests.getStore()?.actor;
}
