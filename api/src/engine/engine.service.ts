import { Injectable, type OnModuleDestroy } from '@nestjs/common';
import { availableParallelism } from 'node:os';
import { Worker } from 'node:worker_threads';
import { Problem } from '../faults/problem.js';
import type { Answer, Order, TaskInput, TaskName, TaskOutput } from './tasks.js';

type Task = Order & {
  readonly done: (output: unknown) => void;
  readonly failed: (error: unknown) => void;
};

/** A thread and what it is at. */
type Thread = { readonly worker: Worker; task: Task | undefined };

const THREAD = new URL('./engine-thread.js', import.meta.url);

/** More than this many tasks in the queue, and the service says that it is busy instead of taking more. */
const MOST_WAITING = 200;

/**
 * The engine on threads of its own, so that a large building holds up nobody else's request. Threads start when they are needed; one
 * that dies fails its task and is replaced.
 */
@Injectable()
export class EngineService implements OnModuleDestroy {
  private readonly threads = new Set<Thread>();
  private readonly queue: Task[] = [];
  private readonly most = Math.max(1, availableParallelism() - 1);
  private closed = false;

  /** @throws Problem 503 when too much waits, or the service is ending */
  run<Name extends TaskName>(name: Name, input: TaskInput<Name>): Promise<TaskOutput<Name>> {
    if (this.closed || this.queue.length >= MOST_WAITING) {
      throw new Problem(503, 'busy', 'The engine has too much to do. Try again in a moment.');
    }
    return new Promise<TaskOutput<Name>>((resolve, reject) => {
      this.queue.push({ name, input, done: (output) => resolve(output as TaskOutput<Name>), failed: reject });
      this.next();
    });
  }

  async onModuleDestroy(): Promise<void> {
    this.closed = true;
    for (const task of this.queue.splice(0)) task.failed(ending());
    await Promise.all([...this.threads].map(({ worker }) => worker.terminate()));
  }

  private next(): void {
    if (this.queue.length === 0 || this.closed) return;
    const idle = [...this.threads].find(({ task }) => task === undefined);
    const thread = idle ?? (this.threads.size < this.most ? this.start() : undefined);
    if (thread === undefined) return;
    thread.task = this.queue.shift();
    if (thread.task === undefined) return;
    const { name, input } = thread.task;
    thread.worker.postMessage({ name, input } satisfies Order);
  }

  private start(): Thread {
    // Without the flags of the process: what a thread loads is what was built.
    const thread: Thread = { worker: new Worker(THREAD, { execArgv: [] }), task: undefined };
    this.threads.add(thread);
    thread.worker.on('message', (answer: Answer) => {
      const { task } = thread;
      thread.task = undefined;
      if (answer.ok) task?.done(answer.output);
      else task?.failed(answer.error);
      this.next();
    });
    const gone = (error: unknown): void => {
      this.threads.delete(thread);
      thread.task?.failed(this.closed ? ending() : error);
      thread.task = undefined;
      this.next();
    };
    thread.worker.on('error', gone);
    thread.worker.on('exit', (code) => gone(new Error(`an engine thread ended with code ${code}`)));
    return thread;
  }
}

function ending(): Problem {
  return new Problem(503, 'ending', 'The service is ending.');
}
