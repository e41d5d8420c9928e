import { Transaction, type Sequelize } from 'sequelize';

/** The queue is full: the caller must refuse its request rather than answer without a record. */
export class WriteQueueFullError extends Error {
  override readonly name = 'WriteQueueFullError';
}

/** The queue has been closed for shutdown. */
export class WriteQueueClosedError extends Error {
  override readonly name = 'WriteQueueClosedError';
}

interface Waiting<Row> {
  readonly row: Row;
  readonly resolve: () => void;
  readonly reject: (error: unknown) => void;
}

/** Stores a group of rows within the given transaction. */
export type StoreRows<Row> = (rows: readonly Row[], transaction: Transaction) => Promise<void>;

/**
 * The one place where this process writes to SQLite. SQLite takes one writer at a time; two transactions that
 * read and then write starve each other, so every write waits its turn here.
 *
 * `append` is a group commit: rows that arrive while a commit runs are stored together by the next one, and
 * each caller goes on only after its row is committed. `run` gives a unit of work a transaction of its own.
 */
export class WriteQueue<Row> {
  readonly #sequelize: Sequelize;
  readonly #store: StoreRows<Row>;
  readonly #bound: number;
  #rows: Waiting<Row>[] = [];
  #work: (() => Promise<void>)[] = [];
  #draining = false;
  #drained: Promise<void> = Promise.resolve();
  #closed = false;

  constructor(sequelize: Sequelize, store: StoreRows<Row>, bound = 10_000) {
    this.#sequelize = sequelize;
    this.#store = store;
    this.#bound = bound;
  }

  /** How many rows and units of work wait. */
  get depth(): number {
    return this.#rows.length + this.#work.length;
  }

  /** Resolves once the row is committed. */
  append(row: Row): Promise<void> {
    return new Promise((resolve, reject) => {
      const refusal = this.#refusal();
      if (refusal) return reject(refusal);
      this.#rows.push({ row, resolve, reject });
      this.#start();
    });
  }

  /** Runs work in an immediate transaction of its own and resolves with its result once that is committed. */
  run<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
    return new Promise((resolve, reject) => {
      const refusal = this.#refusal();
      if (refusal) return reject(refusal);
      this.#work.push(() => this.#transaction(work).then(resolve, reject));
      this.#start();
    });
  }

  /** Refuses what comes from now on and resolves when everything that waited is committed. */
  async close(): Promise<void> {
    this.#closed = true;
    await this.#drained;
  }

  #refusal(): Error | null {
    if (this.#closed) return new WriteQueueClosedError('The service is shutting down.');
    if (this.depth >= this.#bound) return new WriteQueueFullError(`${this.depth} writes wait already.`);
    return null;
  }

  #start(): void {
    if (this.#draining) return;
    this.#draining = true;
    this.#drained = this.#drain();
  }

  async #drain(): Promise<void> {
    while (this.depth > 0) {
      await this.#commitRows();
      await this.#work.shift()?.();
    }
    // In the same step as the last look at the queue: whatever comes later starts a drain of its own.
    this.#draining = false;
  }

  async #commitRows(): Promise<void> {
    const group = this.#rows;
    if (group.length === 0) return;
    this.#rows = [];
    try {
      await this.#transaction((transaction) => this.#store(group.map((each) => each.row), transaction));
      for (const each of group) each.resolve();
    } catch (error) {
      for (const each of group) each.reject(error);
    }
  }

  #transaction<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
    return this.#sequelize.transaction({ type: Transaction.TYPES.IMMEDIATE }, work);
  }
}
