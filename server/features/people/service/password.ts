import { hash, verify } from '@node-rs/argon2';

// argon2id with 19 MiB, 2 passes, 1 lane: the least that the OWASP password storage guide names.
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize('NFKC'), cost);
}

// Of a password nobody has: compared where there is no account, so that the answer takes as long.
const emptyHash = hashPassword('a password that nobody has');

/** Compares in the same time whether or not there is a hash to compare with. */
export async function passwordFits(password: string, passwordHash: string | null): Promise<boolean> {
  const fits = await verify(passwordHash ?? (await emptyHash), password.normalize('NFKC'));
  return fits && passwordHash !== null;
}
