import { Algorithm, hash, verify } from '@node-rs/argon2';

export interface PasswordCost {
  memoryCost: number;
  timeCost: number;
}

/** Above the least that OWASP's password storage guidance asks of argon2id, and under a quarter second. */
export const PASSWORD_COST: PasswordCost = { memoryCost: 65_536, timeCost: 3 };

/** Hashes and checks passwords with argon2id. */
export function passwords(cost: PasswordCost) {
  const hashOf = (password: string): Promise<string> =>
    hash(password, { algorithm: Algorithm.Argon2id, parallelism: 1, ...cost });

  /** Of a password nobody has: an unknown account takes as long to refuse as a known one. */
  let nobodys: Promise<string> | undefined;

  return {
    hash: hashOf,

    /** Whether the password is the one that was hashed; a hash of null stands for an unknown account. */
    async verify(password: string, hashed: string | null): Promise<boolean> {
      nobodys ??= hashOf(crypto.randomUUID());
      const matches = await verify(hashed ?? (await nobodys), password);
      return matches && hashed !== null;
    },
  };
}

export type Passwords = ReturnType<typeof passwords>;
