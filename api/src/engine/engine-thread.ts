/** A thread of the engine: does one task after the other. */
import { parentPort } from 'node:worker_threads';
import { tasks, type Answer, type Order } from './tasks.js';

parentPort?.on('message', ({ name, input }: Order) => {
  let answer: Answer;
  try {
    answer = { ok: true, output: (tasks[name] as (input: unknown) => unknown)(input) };
  } catch (error) {
    answer = { ok: false, error };
  }
  parentPort?.postMessage(answer);
});
