import type { Sequelize, Transaction } from "sequelize";

/** What a seeder is handed; every statement of it goes through `transaction`. */
export interface SeedContext {
  readonly sequelize: Sequelize;
  readonly transaction: Transaction;
}

export interface Seeder {
  readonly name: string;
  /** Belongs to the demo organisation: left out of a database that asks for none. */
  readonly demo: boolean;
  /**
   * Finds or creates by natural key, never overwrites a row that was edited, may be run again at any
   * start. Answers what it added, one line a thing; nothing added, no lines.
   */
  run(context: SeedContext): Promise<string[]>;
}
