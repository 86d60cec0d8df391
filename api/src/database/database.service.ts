/** The database: Prisma for the service's tables, the pool beneath it for sign-in and bulk rows. */
import { Injectable, type OnModuleDestroy } from '@nestjs/common';
import { PrismaPg } from '@prisma/adapter-pg';
import pg from 'pg';
import { PrismaClient } from '../generated/client.js';
import { actor } from './actor.js';

@Injectable()
export class DatabaseService implements OnModuleDestroy {
  readonly pool: pg.Pool;
  readonly prisma: PrismaClient;

  constructor(url: string) {
    this.pool = new pg.Pool({ connectionString: url, max: 10, connectionTimeoutMillis: 5000 });
    // An idle connection that the server closes is not an error of a request; the pool opens another.
    this.pool.on('error', () => undefined);
    this.prisma = new PrismaClient({ adapter: new PrismaPg(this.pool) });
  }

  /** A write: one transaction, which the audit trail tells by the one whose request it is. */
  write<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
    return this.prisma.$transaction(
      async (transaction) => {
        const by = actor();
        if (by !== undefined) {
          await transaction.$queryRaw`
            SELECT set_config('groundward.actor', ${by.id}, true), set_config('groundward.actor_name', ${by.name}, true)`;
        }
        return work(transaction);
      },
      { timeout: 60_000, maxWait: 10_000 },
    );
  }

  /** Whether the database answers and is migrated. */
  async answers(): Promise<boolean> {
    return this.pool.query('SELECT 1 FROM "project" LIMIT 1').then(
      () => true,
      () => false,
    );
  }

  async onModuleDestroy(): Promise<void> {
    await this.prisma.$disconnect();
    if (!this.pool.ended) await this.pool.end();
  }
}

/** What a transaction offers. */
export type Transaction = Parameters<Parameters<PrismaClient['$transaction']>[0]>[0];
