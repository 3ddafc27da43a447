import { hash, verify } from '@node-rs/argon2';

/** OWASP's first choice for argon2id, which is the library's default: 19 MiB, two passes, one lane. About 40 ms. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string) => hash(password, COST);

let nobody: Promise<string> | undefined;

/**
 * Whether the password belongs to the hash. Without a hash it is compared with one that nothing matches, so that the
 * answer for an address that nobody has takes as long as the one for a wrong password.
 */
export async function passwordMatches(passwordHash: string | undefined, password: string): Promise<boolean> {
  const matches = await verify(passwordHash ?? (await (nobody ??= hashPassword(crypto.randomUUID()))), password);
  return passwordHash !== undefined && matches;
}
