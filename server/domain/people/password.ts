import { hash, verify } from '@node-rs/argon2';

/** OWASP's minimum for Argon2id: 19 MiB, two passes, one lane. */
/** The package's enumeration of algorithms exists only as types; 2 is Argon2id. */
const ARGON2ID = 2;

const PARAMETERS = { algorithm: ARGON2ID, memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password, PARAMETERS);
}

export function passwordMatches(passwordHash: string, password: string): Promise<boolean> {
  return verify(passwordHash, password);
}

let decoy: Promise<string> | null = null;

/** Spends the time of a password check on nobody, so that an unknown address answers no sooner than a wrong password. */
export async function matchNobody(password: string): Promise<false> {
  decoy ??= hashPassword('nobody has this password');
  await passwordMatches(await decoy, password);
  return false;
}
