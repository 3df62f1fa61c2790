import { hash, verify } from '@node-rs/argon2';
import { PASSWORD_MAX } from '../../shared/contracts/accounts';

/**
 * argon2id (the package's default) with 19 MiB, two passes and one lane: the first choice of OWASP's Password
 * Storage Cheat Sheet.
 */
const PARAMETERS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password, PARAMETERS);

let decoy: Promise<string> | null = null;

/**
 * Whether the password belongs to the hash. Takes the same time without a hash, so that nobody learns from the
 * clock which addresses have an account.
 */
export async function verifyPassword(passwordHash: string | null, password: string): Promise<boolean> {
  if (password.length > PASSWORD_MAX) return false;
  decoy ??= hashPassword('no account has this password');
  const matches = await verify(passwordHash ?? (await decoy), password);
  return passwordHash !== null && matches;
}
