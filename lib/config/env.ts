import { z } from "zod";

/** Every setting the program reads, checked once. The only reader of process.env. */
const Environment = z.object({
  databaseUrl: z.string().min(1, "DATABASE_URL says which database to use."),
  dataDir: z.string().min(1).optional(),
  authSecret: z.string().min(16).optional(),
  baseUrl: z.url().optional(),
  isProduction: z.boolean(),
  logLevel: z.enum(["trace", "debug", "info", "warn", "error", "fatal", "silent"]).default("info"),
});
export type Environment = Readonly<z.infer<typeof Environment>>;

let checked: Environment | undefined;

/** @throws Error naming every setting that is missing or malformed. */
export function environment(): Environment {
  checked ??= Environment.parse({
    databaseUrl: process.env["DATABASE_URL"],
    dataDir: process.env["PANELWRIGHT_DATA_DIR"],
    authSecret: process.env["NEXTAUTH_SECRET"],
    baseUrl: process.env["NEXTAUTH_URL"],
    logLevel: process.env["LOG_LEVEL"],
    isProduction: process.env["NODE_ENV"] === "production",
  });
  return checked;
}
