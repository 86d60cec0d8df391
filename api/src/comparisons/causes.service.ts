import { Inject, Injectable } from '@nestjs/common';
import type { Compared } from '@groundward/engine/compare/compare';
import type { Comparison } from '@groundward/engine/compare/result';
import { EngineService } from '../engine/engine.service.js';

/** So many comparisons with their causes are kept. */
const KEPT = 16;

/** Causes take many analyses: what is being worked out is worked out once, and the last answers are kept. */
@Injectable()
export class CausesService {
  private readonly known = new Map<string, Promise<Comparison>>();

  constructor(@Inject(EngineService) private readonly engine: EngineService) {}

  /** @param key what the answer hangs on: the hashes of both buildings */
  between(key: string, before: Compared, after: Compared): Promise<Comparison> {
    const known = this.known.get(key);
    if (known !== undefined) return known;
    const [first] = this.known.keys();
    if (this.known.size >= KEPT && first !== undefined) this.known.delete(first);
    const asked = this.engine.run('causes', { before, after });
    this.known.set(key, asked);
    asked.catch(() => this.known.delete(key));
    return asked;
  }
}
