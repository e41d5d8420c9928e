import type { Database } from '../database.ts';
import type { PersonRow } from '../models/person.ts';

export interface PeopleRepository {
  byEmail(email: string): Promise<PersonRow | null>;
  byId(id: string): Promise<PersonRow | null>;
  countAdministrators(): Promise<number>;
  insert(person: PersonRow): Promise<void>;
}

export function peopleRepository({ people, writes }: Database): PeopleRepository {
  return {
    byEmail: async (email) => (await people.findOne({ where: { email } }))?.get() ?? null,
    byId: async (id) => (await people.findByPk(id))?.get() ?? null,
    countAdministrators: () => people.count({ where: { role: 'administrator', deactivatedAt: null } }),
    insert: (person) => writes.run(async (transaction) => {
      await people.create(person, { transaction });
    }),
  };
}
