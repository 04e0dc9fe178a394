import { createHmac } from 'node:crypto';
import type { Pool } from 'pg';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { Problem } from '../../errors/problem';

const QUARTER_SECONDS = 15 * 60;

/** Failures allowed in a quarter of an hour. */
const LIMITS = {
  /** One account from one address: somebody who mistypes, or guesses. */
  pair: 10,
  /** One account from anywhere: higher, so that nobody locks another out with ease. */
  account: 60,
  /** One address over all accounts. */
  address: 100,
} as const;

type Limit = keyof typeof LIMITS;

/** Counts failed sign-ins in the database, so that all web nodes count together. */
export class SignInLimits {
  private readonly limiters: Record<Limit, RateLimiterPostgres>;

  constructor(
    pool: Pool,
    private readonly secret: string,
  ) {
    const limiter = (name: Limit) =>
      new RateLimiterPostgres({
        storeClient: pool,
        storeType: 'pool',
        tableName: 'rate_limits',
        tableCreated: true,
        clearExpiredByTimeout: false,
        keyPrefix: name,
        points: LIMITS[name],
        duration: QUARTER_SECONDS,
      });
    this.limiters = { pair: limiter('pair'), account: limiter('account'), address: limiter('address') };
  }

  /** Names are kept as a keyed hash: people type passwords into the wrong field. */
  private keys(email: string, address: string): [Limit, string][] {
    const account = createHmac('sha256', this.secret).update(email).digest('base64url');
    return [
      ['pair', `${account} ${address}`],
      ['account', account],
      ['address', address],
    ];
  }

  /** Throws while one of the limits is reached. */
  async require(email: string, address: string): Promise<void> {
    for (const [name, key] of this.keys(email, address)) {
      const state = await this.limiters[name].get(key);
      if (state && state.consumedPoints >= LIMITS[name]) throw tooMany(state.msBeforeNext);
    }
  }

  /** Counts a failure. Of guesses that run at once, those beyond the limit are not told that they were wrong. */
  async failed(email: string, address: string): Promise<void> {
    const refusals: RateLimiterRes[] = [];
    for (const [name, key] of this.keys(email, address)) {
      await this.limiters[name].consume(key).catch((refusal: unknown) => {
        if (!(refusal instanceof RateLimiterRes)) throw refusal;
        refusals.push(refusal);
      });
    }
    const [refusal] = refusals;
    if (refusal) throw tooMany(refusal.msBeforeNext);
  }

  /**
   * The right password clears what was counted against this account from this address; not where others that were
   * tried at the same time have reached the limit meanwhile.
   */
  async succeeded(email: string, address: string): Promise<void> {
    await this.require(email, address);
    const [[, pair] = ['pair', '']] = this.keys(email, address);
    await this.limiters.pair.delete(pair);
  }
}

const tooMany = (ms: number) =>
  new Problem('too-many-requests', {
    detail: 'Too many sign-ins failed. Wait a little, or have your password reset.',
    retryAfterSeconds: Math.max(1, Math.ceil(ms / 1000)),
  });

const made = new WeakMap<Pool, SignInLimits>();

/** The limits of this server: one set for each pool. */
export function signInLimits(pool: Pool, secret: string): SignInLimits {
  const known = made.get(pool);
  if (known) return known;
  const fresh = new SignInLimits(pool, secret);
  made.set(pool, fresh);
  return fresh;
}
