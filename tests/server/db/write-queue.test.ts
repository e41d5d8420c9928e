import { mkdtemp, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openDatabase } from '#server/db/connection.ts';
import { WriteQueue, WriteQueueClosedError, WriteQueueFullError } from '#server/db/write-queue.ts';

let directory: string;
let database: ReturnType<typeof openDatabase>;
beforeEach(async () => {
  directory = await mkdtemp(path.join(os.tmpdir(), 'dextral-queue-'));
  database = openDatabase(path.join(directory, 'queue.sqlite'));
  await database.query('CREATE TABLE numbers (n INTEGER UNIQUE)');
});
afterEach(async () => {
  await database.close();
  await rm(directory, { recursive: true, force: true });
});

const stored = async () => (await database.query('SELECT n FROM numbers ORDER BY n'))[0].map((row) => (row as { n: number }).n);

function queueOf(bound?: number) {
  const groups: number[][] = [];
  const queue = new WriteQueue<number>(database, async (rows, transaction) => {
    groups.push([...rows]);
    for (const n of rows) await database.query(`INSERT INTO numbers VALUES (${n})`, { transaction });
  }, bound);
  return { queue, groups };
}

describe('WriteQueue', () => {
  it('commits rows that arrive together in few groups, each before its caller goes on', async () => {
    const { queue, groups } = queueOf();
    await Promise.all(Array.from({ length: 50 }, async (_, n) => {
      await queue.append(n);
      expect(await stored()).toContain(n);
    }));
    expect(groups.length).toBeLessThan(10);
    expect(await stored()).toHaveLength(50);
  });

  it('rejects the rows of a group that failed, keeps none of them, and goes on', async () => {
    const { queue } = queueOf();
    await queue.append(1);
    await expect(Promise.all([queue.append(2), queue.append(2)])).rejects.toThrow();
    await queue.append(3);
    expect((await stored()).filter((n) => n !== 2)).toEqual([1, 3]);
  });

  it('runs units of work one after another, each in a transaction of its own', async () => {
    const { queue } = queueOf();
    const count = () => queue.run(async (transaction) => {
      const [[row]] = await database.query('SELECT COUNT(*) AS n FROM numbers', { transaction }) as unknown as [[{ n: number }]];
      await database.query(`INSERT INTO numbers VALUES (${row.n})`, { transaction });
      return row.n;
    });
    expect(await Promise.all(Array.from({ length: 20 }, count))).toEqual(Array.from({ length: 20 }, (_, n) => n));
    await expect(queue.run(async (transaction) => {
      await database.query('INSERT INTO numbers VALUES (99)', { transaction });
      throw new Error('no');
    })).rejects.toThrow('no');
    expect(await stored()).not.toContain(99);
  });

  it('refuses past its bound, and after it was closed, but drains what waited', async () => {
    const { queue } = queueOf(3);
    const answers = await Promise.allSettled(Array.from({ length: 8 }, (_, n) => queue.append(n)));
    const refused = answers.filter((answer) => answer.status === 'rejected');
    expect(refused.length).toBeGreaterThan(0);
    expect(refused.every(({ reason }) => reason instanceof WriteQueueFullError)).toBe(true);
    const last = queue.append(100);
    await queue.close();
    await last;
    await expect(queue.append(101)).rejects.toBeInstanceOf(WriteQueueClosedError);
    expect(await stored()).toContain(100);
  });
});
