import { RateLimiterMemory, RateLimiterRes } from "rate-limiter-flexible";
import { HttpProblem } from "./problems";

interface Row {
  /** Tries within `seconds`. */
  readonly tries: number;
  readonly seconds: number;
  /** The wait after too many, in seconds; doubles with every further wait of a day, up to `longest`. */
  readonly wait: number;
  readonly longest: number;
}

const minute = 60;
const hour = 60 * minute;
const day = 24 * hour;

/**
 * How often something may be tried. Counters live in the memory of the one server process: a restart
 * forgives, which costs a guesser more time than it gains.
 */
const rows = {
  /** Sign-ins to one account; a right one is forgiven. */
  "sign-in-account": { tries: 8, seconds: 15 * minute, wait: minute, longest: hour },
  /** Sign-ins from one address, right or wrong. */
  "sign-in-address": { tries: 60, seconds: 15 * minute, wait: 5 * minute, longest: 4 * hour },
  "sign-up-address": { tries: 40, seconds: hour, wait: hour, longest: day },
  /** Links mailed to one account. */
  "reset-account": { tries: 3, seconds: hour, wait: hour, longest: day },
  "reset-address": { tries: 20, seconds: hour, wait: hour, longest: day },
  /** Mailed links tried from one address. */
  "token-address": { tries: 60, seconds: hour, wait: 10 * minute, longest: 4 * hour },
  /** Evaluations of one address: twenty a second, sustained. */
  evaluate: { tries: 1200, seconds: minute, wait: 10, longest: 10 },
} as const satisfies Record<string, Row>;

export type RateLimit = keyof typeof rows;

interface Counters {
  readonly tries: RateLimiterMemory;
  readonly waits: RateLimiterMemory;
}

const kept = globalThis as { leadingOrderLimits?: Map<RateLimit, Counters> };

function counters(name: RateLimit): Counters {
  kept.leadingOrderLimits ??= new Map();
  const known = kept.leadingOrderLimits.get(name);
  if (known) return known;
  const { tries: points, seconds: duration } = rows[name];
  const made = {
    tries: new RateLimiterMemory({ keyPrefix: name, points, duration }),
    waits: new RateLimiterMemory({ keyPrefix: `${name} waits`, points, duration: day }),
  };
  kept.leadingOrderLimits.set(name, made);
  return made;
}

/** The wait that begins, in seconds: twice the one before. */
async function beginWait(name: RateLimit, key: string): Promise<number> {
  const { tries, waits } = counters(name);
  const { wait, longest } = rows[name];
  const { consumedPoints: count } = await waits.penalty(key);
  const seconds = Math.min(wait * 2 ** Math.min(count - 1, 20), longest);
  await tries.block(key, seconds);
  return seconds;
}

function tooMany(seconds: number): HttpProblem {
  const wait = seconds > 90 ? `${Math.ceil(seconds / 60)} minutes` : `${seconds} seconds`;
  return new HttpProblem("too-many-requests", {
    detail: `Too many tries. Wait ${wait} and try again.`,
    headers: { "retry-after": String(seconds) },
  });
}

/**
 * Count one try. Throws `too-many-requests` with `Retry-After` when there were too many; each wait of
 * a day is twice as long as the one before.
 */
export async function countTry(name: RateLimit, key: string): Promise<void> {
  try {
    await counters(name).tries.consume(key);
  } catch (result) {
    if (!(result instanceof RateLimiterRes)) throw result;
    const begins = result.consumedPoints === rows[name].tries + 1;
    throw tooMany(
      begins ? await beginWait(name, key) : Math.max(1, Math.ceil(result.msBeforeNext / 1000)),
    );
  }
}

/** Forget the tries and waits of a key, after it proved right. */
export async function forgiveTries(name: RateLimit, key: string): Promise<void> {
  const { tries, waits } = counters(name);
  await tries.delete(key);
  await waits.delete(key);
}

/** Forget everything that was counted. */
export function forgiveEverybody(): void {
  kept.leadingOrderLimits?.clear();
}
