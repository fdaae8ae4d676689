import { database } from "@/lib/db/transaction";
import { ENGINE } from "@/lib/evaluation/engine";
import { logger } from "@/lib/log/logger";
import type { Health } from "@/lib/schemas/health";

/** Whether the program can work. Why it cannot stays in the log. */
export async function checkHealth(version: string): Promise<Health> {
  const reachable = await database()
    .query("SELECT 1 FROM organisations LIMIT 1")
    .then(
      () => true,
      (error: unknown) => {
        logger.error({ err: error }, "the database cannot be used");
        return false;
      },
    );
  return {
    ok: reachable,
    database: reachable ? "reachable" : "unreachable",
    version,
    engine: ENGINE,
  };
}
