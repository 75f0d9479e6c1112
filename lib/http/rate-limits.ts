import { RateLimiterMemory, RateLimiterRes } from "rate-limiter-flexible";
import { HttpProblem } from "./problems";

/**
 * How often something may be tried. Counters live in the server's memory: a restart forgives, which
 * costs a guesser more time than it gains him.
 */
const rows = {
  /** Failed sign-ins for one account; the block doubles the wait of the next try. */
  "sign-in-account": { points: 8, duration: 15 * 60, blockDuration: 15 * 60 },
  /** Sign-ins from one address, right or wrong. */
  "sign-in-address": { points: 60, duration: 15 * 60, blockDuration: 15 * 60 },
  "sign-up-address": { points: 40, duration: 60 * 60, blockDuration: 60 * 60 },
  "reset-account": { points: 3, duration: 60 * 60, blockDuration: 60 * 60 },
  "reset-address": { points: 20, duration: 60 * 60, blockDuration: 60 * 60 },
  /** Evaluations of one address: twenty a second, sustained. */
  evaluate: { points: 1200, duration: 60, blockDuration: 10 },
} as const;

export type RateLimit = keyof typeof rows;

const kept = globalThis as { leadingOrderLimits?: Map<RateLimit, RateLimiterMemory> };

function limiter(name: RateLimit): RateLimiterMemory {
  kept.leadingOrderLimits ??= new Map();
  const known = kept.leadingOrderLimits.get(name);
  if (known) return known;
  const made = new RateLimiterMemory({ keyPrefix: name, ...rows[name] });
  kept.leadingOrderLimits.set(name, made);
  return made;
}

/** Count one try. Throws `too-many-requests` with `Retry-After` when there were too many. */
export async function countTry(name: RateLimit, key: string): Promise<void> {
  try {
    await limiter(name).consume(key);
  } catch (result) {
    if (!(result instanceof RateLimiterRes)) throw result;
    const seconds = Math.ceil(result.msBeforeNext / 1000);
    const wait = seconds > 90 ? `${Math.ceil(seconds / 60)} minutes` : `${seconds} seconds`;
    throw new HttpProblem("too-many-requests", {
      detail: `Too many tries. Wait ${wait} and try again.`,
      headers: { "retry-after": String(seconds) },
    });
  }
}

/** Forget the tries of a key, after it proved right. */
export async function forgiveTries(name: RateLimit, key: string): Promise<void> {
  await limiter(name).delete(key);
}

/** The address a request came from, as far as the server can tell. */
export function addressOf(request: Request): string {
  return request.headers.get("x-forwarded-for")?.split(",")[0]?.trim() || "local";
}
