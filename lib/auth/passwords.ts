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

/** Take as long as a real check does, where there is no account to check. */
export async function verifyNothing(password: string): Promise<false> {
  decoy ??= hashPassword("no account has this password");
  await verifyPassword(await decoy, password);
  return false;
}
