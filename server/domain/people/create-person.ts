import { randomUUID } from 'node:crypto';
import type { Role } from '#shared/api/roles.ts';
import type { PeopleRepository } from '#server/db/repositories/people.ts';
import type { Clock } from '../clock.ts';
import { hashPassword } from './password.ts';

export interface NewPerson {
  readonly email: string;
  readonly name: string;
  readonly role: Role;
  readonly password: string;
}

/** Adds a person; returns the id. */
export async function createPerson(context: { people: PeopleRepository; clock: Clock }, person: NewPerson): Promise<string> {
  const id = randomUUID();
  await context.people.insert({
    id, email: person.email, name: person.name, role: person.role, passwordHash: await hashPassword(person.password),
    createdAt: context.clock(), deactivatedAt: null,
  });
  return id;
}
