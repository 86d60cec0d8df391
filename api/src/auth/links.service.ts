/** One-time links: the only ways to an account. */
import { createHash, randomBytes } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import { isAPIError } from 'better-auth/api';
import { AccessService } from '../access/access.service.js';
import { fromDatabaseRole, toDatabaseRole, type Role } from '../access/roles.js';
import { setActor } from '../database/actor.js';
import { DatabaseService } from '../database/database.service.js';
import { Problem } from '../faults/problem.js';
import type { Link } from '../generated/client.js';
import type { Accounts } from './accounts.js';
import { ACCOUNTS } from './tokens.js';

const OWNER_LINK_HOURS = 24 * 7;
const INVITATION_HOURS = 24 * 14;

export type NewAccount = { readonly name: string; readonly email: string; readonly password: string };

type Invitation = Link & { readonly projectId: string; readonly email: string };

@Injectable()
export class LinksService {
  constructor(
    @Inject(DatabaseService) private readonly database: DatabaseService,
    @Inject(AccessService) private readonly access: AccessService,
    @Inject(ACCOUNTS) private readonly accounts: Accounts,
  ) {}

  /** A new owner link, as long as nobody has an account; earlier ones are withdrawn. */
  async ownerToken(): Promise<string | undefined> {
    if (await this.somebodyIsIn()) return undefined;
    await this.database.write((transaction) =>
      transaction.link.deleteMany({ where: { projectId: null, usedAt: null } }),
    );
    return this.make({ projectId: null, email: null, role: 'owner', hours: OWNER_LINK_HOURS });
  }

  invitation(projectId: string, email: string, role: Role): Promise<string> {
    return this.make({ projectId, email, role, hours: INVITATION_HOURS });
  }

  /** Makes the first account, the owner of everything that is there. */
  async becomeOwner(token: string, account: NewAccount): Promise<Headers> {
    const link = await this.find(token);
    if (link?.projectId !== null || (await this.somebodyIsIn())) throw linkGone();
    // All owner links are used up with the first: of several people with one each, one becomes the owner.
    const used = await this.database.write((transaction) =>
      transaction.link.updateManyAndReturn({
        where: { projectId: null, usedAt: null },
        data: { usedAt: new Date() },
        select: { id: true },
      }),
    );
    if (!used.some(({ id }) => id === link.id)) throw linkGone();
    const { headers, userId } = await this.signUp(account, link.id);
    setActor({ id: userId, name: account.name });
    await this.access.grantEverything(userId);
    return headers;
  }

  /** Makes an account for an invited person, with the role in the project. */
  async acceptInvitation(token: string, name: string, password: string): Promise<Headers> {
    const link = await this.find(token);
    if (!isInvitation(link)) throw linkGone();
    setActor({ id: '', name: `${name} (by invitation)` });
    const { count } = await this.database.write((transaction) =>
      transaction.link.updateMany({ where: { id: link.id, usedAt: null }, data: { usedAt: new Date() } }),
    );
    if (count === 0) throw linkGone();
    const { headers, userId } = await this.signUp({ name, email: link.email, password }, link.id);
    setActor({ id: userId, name });
    await this.access.grant(link.projectId, userId, fromDatabaseRole(link.role));
    return headers;
  }

  private async somebodyIsIn(): Promise<boolean> {
    return (await this.database.prisma.user.findFirst({ select: { id: true } })) !== null;
  }

  private async make(link: {
    readonly projectId: string | null;
    readonly email: string | null;
    readonly role: Role;
    readonly hours: number;
  }): Promise<string> {
    const token = randomBytes(32).toString('base64url');
    await this.database.write((transaction) =>
      transaction.link.create({
        data: {
          tokenHash: hashOf(token),
          projectId: link.projectId,
          email: link.email?.toLowerCase() ?? null,
          role: toDatabaseRole(link.role),
          expiresAt: new Date(Date.now() + link.hours * 3_600_000),
        },
      }),
    );
    return token;
  }

  /** A link that may still be used. */
  private async find(token: string): Promise<Link | undefined> {
    // The look-up is by the hash of 256 random bits: its timing tells nothing about a token.
    const link = await this.database.prisma.link.findUnique({ where: { tokenHash: hashOf(token) } });
    return link === null || link.usedAt !== null || link.expiresAt < new Date() ? undefined : link;
  }

  private async signUp(
    account: NewAccount,
    linkId: string,
  ): Promise<{ readonly headers: Headers; readonly userId: string }> {
    try {
      const { headers, response } = await this.accounts.api.signUpEmail({
        body: { name: account.name, email: account.email.toLowerCase(), password: account.password },
        returnHeaders: true,
      });
      return { headers, userId: response.user.id };
    } catch (error) {
      // The link is given back: whatever was wrong with the account can be mended and tried again.
      await this.database.write((transaction) =>
        transaction.link.update({ where: { id: linkId }, data: { usedAt: null } }),
      );
      if (isAPIError(error) && error.statusCode < 500) throw new Problem(422, 'account-refused', error.message);
      throw error;
    }
  }
}

function isInvitation(link: Link | undefined): link is Invitation {
  return link !== undefined && link.projectId !== null && link.email !== null;
}

function linkGone(): Problem {
  return new Problem(410, 'link-gone', 'This link was used already, has expired, or never existed.');
}

function hashOf(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
