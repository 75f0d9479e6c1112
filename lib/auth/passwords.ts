import { hash, verify } from "@node-rs/argon2";

/** argon2id with the parameters of the OWASP password storage cheat sheet: 19 MiB, 2 passes. */
const options = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** The hash of a password, with its salt and parameters. */
export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize("NFKC"), options);
}

/** True where the password is the one that was hashed. */
export async function verifyPassword(passwordHash: string, password: string): Promise<boolean> {
  return verify(passwordHash, password.normalize("NFKC"));
}

let decoy: Promise<string> | undefined;

/**
 * Which of some hashes is the password's: its place, or -1. Always does the work of `most` checks, so
 * that the time does not tell how many accounts there are, or whether one fits.
 */
export async function findPassword(
  hashes: readonly string[],
  password: string,
  most: number,
): Promise<number> {
  decoy ??= hashPassword("no account has this password");
  const padding = Array.from(
    { length: Math.max(0, most - hashes.length) },
    () => decoy as Promise<string>,
  );
  const all = [...hashes, ...(await Promise.all(padding))];
  const fits = await Promise.all(all.map((one) => verifyPassword(one, password)));
  return fits.slice(0, hashes.length).indexOf(true);
}
