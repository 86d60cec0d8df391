import { Inject, Injectable } from '@nestjs/common';
import { DatabaseService } from '../database/database.service.js';
import type { SignedIn } from './session.guard.js';

/** The people with an account, for other features to name them. */
@Injectable()
export class PeopleService {
  constructor(@Inject(DatabaseService) private readonly database: DatabaseService) {}

  byEmail(email: string): Promise<SignedIn | null> {
    return this.database.prisma.user.findUnique({
      where: { email: email.toLowerCase() },
      select: { id: true, name: true, email: true },
    });
  }
}
