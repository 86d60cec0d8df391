/** Accounts and sessions by better-auth, on the service's own pool. */
import { betterAuth } from 'better-auth';
import type pg from 'pg';

export type AccountsOptions = { readonly pool: pg.Pool; readonly secret: string; readonly origin: string };

/** Carries the caller's address, as the service sees it, to where sign-in tries are counted. */
export const ADDRESS_HEADER = 'x-groundward-address';

export type Accounts = ReturnType<typeof makeAccounts>;

export function makeAccounts({ pool, secret, origin }: AccountsOptions) {
  return betterAuth({
    database: pool,
    secret,
    baseURL: origin,
    basePath: '/api/auth',
    // The caller's own origin is checked for every write before a request gets here.
    trustedOrigins: (request) => {
      const from = request?.headers.get('origin');
      return from === null || from === undefined ? [origin] : [origin, from];
    },
    emailAndPassword: { enabled: true, disableSignUp: false, minPasswordLength: 10, maxPasswordLength: 200 },
    session: { expiresIn: 60 * 60 * 24 * 14, updateAge: 60 * 60 * 24 },
    rateLimit: { enabled: true, window: 60, max: 200, customRules: { '/sign-in/email': { window: 60, max: 20 } } },
    // The service checks the origin of every write itself; a script sends none.
    advanced: {
      disableCSRFCheck: true,
      ipAddress: { ipAddressHeaders: [ADDRESS_HEADER] },
      cookiePrefix: 'groundward',
      defaultCookieAttributes: { sameSite: 'lax', httpOnly: true },
    },
    telemetry: { enabled: false },
    logger: { disabled: true },
  });
}
