import type { Sequelize, Transaction } from "sequelize";
import { environment } from "@/lib/config/env";
import { openDatabase, openedDatabase } from "./sequelize";

export type { Transaction } from "sequelize";

/** The pool of this process; opened at the first use, from the checked environment. */
export function database(): Sequelize {
  return openedDatabase() ?? openDatabase(environment().databaseUrl);
}

/** One use case, one transaction: everything in `work` is kept together or not at all. */
export async function inTransaction<T>(work: (tx: Transaction) => Promise<T>): Promise<T> {
  return database().transaction(work);
}
