/** One-time links: the first owner's, and invitations to a project. Only the hash of a token is kept. */
import { createHash, randomBytes } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import { DatabaseService } from '../database/database.service.js';
import { Problem } from '../faults/problem.js';
import type { Role } from '../access/roles.js';
import { toDatabaseRole } from '../access/roles.js';
import { ACCOUNTS } from './tokens.js';
import type { Accounts } from './accounts.js';

const OWNER_LINK_HOURS = 24 * 7;
const INVITATION_HOURS = 24 * 14;

export type NewAccount = { readonly name: string; readonly email: string; readonly password: string };

@Injectable()
export class LinksService {
  constructor(
    @Inject(DatabaseService) private readonly database: DatabaseService,
    @Inject(ACCOUNTS) private readonly accounts: Accounts,
  ) {}

  /** A new owner link, as long as nobody has an account; earlier ones are withdrawn. */
  async ownerToken(): Promise<string | undefined> {
    if ((await this.database.prisma.user.count()) > 0) return undefined;
    await this.database.prisma.link.deleteMany({ where: { projectId: null, usedAt: null } });
    return this.make({ projectId: null, email: null, role: 'owner', hours: OWNER_LINK_HOURS });
  }

  invitation(projectId: string, email: string, role: Role): Promise<string> {
    return this.make({ projectId, email, role, hours: INVITATION_HOURS });
  }

  /** Makes the first account, the owner of everything that is there. */
  async becomeOwner(token: string, account: NewAccount): Promise<Headers> {
    const link = await this.take(token, (found) => found.projectId === null);
    const headers = await this.signUp(account, link.id);
    const user = await this.database.prisma.user.findUniqueOrThrow({ where: { email: account.email.toLowerCase() } });
    const projects = await this.database.prisma.project.findMany({ select: { id: true } });
    await this.database.prisma.membership.createMany({
      data: projects.map(({ id }) => ({ projectId: id, userId: user.id, role: 'owner' as const })),
      skipDuplicates: true,
    });
    return headers;
  }

  /** Makes an account for an invited person, with the role in the project. */
  async acceptInvitation(token: string, name: string, password: string): Promise<Headers> {
    const link = await this.take(token, (found) => found.projectId !== null && found.email !== null);
    const email = link.email as string;
    const headers = await this.signUp({ name, email, password }, link.id);
    const user = await this.database.prisma.user.findUniqueOrThrow({ where: { email } });
    await this.database.prisma.membership.create({
      data: { projectId: link.projectId as string, userId: user.id, role: link.role },
    });
    return headers;
  }

  private async make(link: {
    projectId: string | null;
    email: string | null;
    role: Role;
    hours: number;
  }): Promise<string> {
    const token = randomBytes(32).toString('base64url');
    await this.database.prisma.link.create({
      data: {
        tokenHash: hashOf(token),
        projectId: link.projectId,
        email: link.email?.toLowerCase() ?? null,
        role: toDatabaseRole(link.role),
        expiresAt: new Date(Date.now() + link.hours * 3_600_000),
      },
    });
    return token;
  }

  /** Uses a link up, once, whoever else tries at the same moment. */
  private async take(token: string, fits: (link: { projectId: string | null; email: string | null }) => boolean) {
    // The look-up is by the hash of 256 random bits: its timing tells nothing about a token.
    const link = await this.database.prisma.link.findUnique({ where: { tokenHash: hashOf(token) } });
    if (link === null || !fits(link) || link.usedAt !== null || link.expiresAt < new Date()) throw linkGone();
    const { count } = await this.database.prisma.link.updateMany({
      where: { id: link.id, usedAt: null },
      data: { usedAt: new Date() },
    });
    if (count === 0) throw linkGone();
    return link;
  }

  private async signUp(account: NewAccount, linkId: string): Promise<Headers> {
    try {
      const { headers } = await this.accounts.api.signUpEmail({
        body: { name: account.name, email: account.email.toLowerCase(), password: account.password },
        returnHeaders: true,
      });
      return headers;
    } catch (error) {
      // The link is given back: whatever was wrong with the account can be mended and tried again.
      await this.database.prisma.link.update({ where: { id: linkId }, data: { usedAt: null } });
      throw new Problem(422, 'account-refused', error instanceof Error ? error.message : String(error));
    }
  }
}

function linkGone(): Problem {
  return new Problem(410, 'link-gone', 'This link was used already, has expired, or never existed.');
}

function hashOf(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
