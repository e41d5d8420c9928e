import { createHash, randomBytes } from 'node:crypto';
import { crc32 } from 'node:zlib';

/**
 * An API key reads `dxt_<prefix>_<secret><check>`: eight characters that may be shown, 32 that may not (190 bits),
 * and six that check the rest, so that a scanner can tell a leaked key from a look-alike without asking the service.
 */
const ALPHABET = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz';
const SHAPE = /^dxt_[0-9A-Za-z]{8}_[0-9A-Za-z]{38}$/;
const CHECK_LENGTH = 6;

export interface NewSecret {
  readonly secret: string;
  readonly prefix: string;
  readonly hash: string;
}

export function newSecret(): NewSecret {
  const prefix = `dxt_${randomText(8)}`;
  const body = `${prefix}_${randomText(32)}`;
  const secret = body + checkOf(body);
  return { secret, prefix, hash: hashSecret(secret) };
}

/** Whether a text has the shape and the check of a key; says nothing of whether it was ever issued. */
export function looksLikeKey(text: string): boolean {
  return SHAPE.test(text) && checkOf(text.slice(0, -CHECK_LENGTH)) === text.slice(-CHECK_LENGTH);
}

/** What is stored. A plain hash suffices: the secret is 190 random bits, not a password. */
export function hashSecret(secret: string): string {
  return createHash('sha256').update(secret).digest('hex');
}

function randomText(length: number): string {
  let text = '';
  while (text.length < length) {
    for (const byte of randomBytes(length)) {
      // 248 is the largest multiple of 62 below 256: bytes above it would favour the first letters.
      if (byte < 248 && text.length < length) text += ALPHABET[byte % 62];
    }
  }
  return text;
}

function checkOf(body: string): string {
  let rest = crc32(body);
  let text = '';
  for (let i = 0; i < CHECK_LENGTH; i++) {
    text = ALPHABET[rest % 62] + text;
    rest = Math.floor(rest / 62);
  }
  return text;
}
