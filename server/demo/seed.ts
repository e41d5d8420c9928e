import { randomInt, randomUUID } from 'node:crypto';
import { insertSeed } from '#server/db/repositories/seed.ts';
import type { ApiKeyRow } from '#server/db/models/api-key.ts';
import { hashPassword } from '#server/domain/people/password.ts';
import { newSecret } from '#server/domain/keys/secret.ts';
import { KEYS, PEOPLE } from '#server/scenario/programme.ts';
import type { Services } from '../services.ts';
import { readDemoFile, writeDemoFile } from './demo-file.ts';
import { pastRecords } from './past-records.ts';

const DAY = 86_400_000;

/**
 * Fills an empty database with the scenario, once. Passwords and secrets are random and kept in demo.json, which is
 * written first: a database that was seeded always has its demo.json.
 */
export async function seedDemo({ people, database, config, clock }: Services): Promise<void> {
  if (await people.countAdministrators() > 0) {
    if (await readDemoFile(config.dataDirectory)) return;
    throw new Error(`${config.dataDirectory} holds a database that is no demo (demo.json is missing): choose another folder with DEXTRAL_DATA_DIR.`);
  }
  const now = clock();
  const accounts = PEOPLE.map((person) => ({ ...person, id: randomUUID(), password: newPassword() }));
  const keys = KEYS.map((key) => ({ ...key, id: randomUUID(), ...newSecret() }));
  await writeDemoFile(config.dataDirectory, {
    url: config.publicUrl.origin,
    accounts: accounts.map(({ email, password, role }) => ({ email, password, role })),
    keys: keys.filter(({ published }) => published).map(({ role, secret }) => ({ role, secret })),
  });

  const personId = new Map(accounts.map(({ email, id }) => [email, id]));
  const administrator = accounts.find(({ role }) => role === 'administrator')!.id;
  const apiKeys = keys.map((key): ApiKeyRow => ({
    id: key.id, name: key.name, prefix: key.prefix, secretHash: key.hash, role: key.role,
    ownerId: personId.get(key.owner)!, createdBy: administrator,
    createdAt: now - key.issuedDaysAgo * DAY,
    expiresAt: key.expiresInDays === undefined ? null : now + key.expiresInDays * DAY,
    revokedAt: key.revokedDaysAgo === undefined ? null : now - key.revokedDaysAgo * DAY,
    lastUsedAt: null, requestsPerMinute: null, attitudesPerMonth: null, attitudesPerCall: null, parallelRequests: null,
  }));
  await insertSeed(database, {
    people: await Promise.all(accounts.map(async ({ id, name, email, role, password }) => ({ id, name, email, role, passwordHash: await hashPassword(password), createdAt: now - 45 * DAY, deactivatedAt: null }))),
    apiKeys,
    records: pastRecords(now, new Map(apiKeys.map((key) => [key.name, key]))),
  });
}

/** Three groups of letters that cannot be mistaken for one another: easy to type, 74 bits. */
function newPassword(): string {
  const letters = 'abcdefghjkmnpqrstuvwxyz23456789';
  return Array.from({ length: 3 }, () => Array.from({ length: 5 }, () => letters[randomInt(letters.length)]).join('')).join('-');
}
