import { Algorithm, hash, verify } from '@node-rs/argon2';

/** Above the least that OWASP's password storage guidance asks of argon2id, and under a quarter second. */
const COST = { algorithm: Algorithm.Argon2id, memoryCost: 65_536, timeCost: 3, parallelism: 1 };

/** Of a password nobody has: an unknown account takes as long to refuse as a known one. */
let nobodys: Promise<string> | undefined;

export const hashPassword = (password: string): Promise<string> => hash(password, COST);

/** Whether the password is the one that was hashed; a hash of null stands for an unknown account. */
export async function verifyPassword(password: string, hashed: string | null): Promise<boolean> {
  nobodys ??= hashPassword(crypto.randomUUID());
  const matches = await verify(hashed ?? (await nobodys), password);
  return matches && hashed !== null;
}
