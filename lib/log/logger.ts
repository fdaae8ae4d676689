import pino from "pino";
import { environment } from "@/lib/config/env";

/** Whatever a caller passes by mistake under these names is struck out before it is written. */
const SECRET_KEYS = [
  "password",
  "passwordHash",
  "token",
  "secret",
  "cookie",
  "authorization",
  "body",
] as const;

const struckOut = SECRET_KEYS.flatMap((key) => [key, `*.${key}`, `*.*.${key}`]);

/** Makes a logger that writes JSON lines; tests hand in their own destination. */
export function createLogger(level: string, destination?: pino.DestinationStream): pino.Logger {
  const options: pino.LoggerOptions = {
    level,
    base: null,
    timestamp: pino.stdTimeFunctions.isoTime,
    redact: { paths: struckOut, censor: "[struck out]" },
    serializers: { err: pino.stdSerializers.err },
  };
  return destination === undefined ? pino(options) : pino(options, destination);
}

/** The one logger of the server. It never writes tokens, passwords or request bodies. */
export const logger = createLogger(environment().logLevel);
