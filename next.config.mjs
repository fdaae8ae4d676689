import { tsImport } from "tsx/esm/api";

// A bad value in the environment stops the build and the start here, with a message that names it.
const { environment } = await tsImport("./lib/config/env.ts", import.meta.url);
environment();

/** @type {import("next").NextConfig} */
const config = {
  poweredByHeader: false,
  reactStrictMode: true,
  // Kept out of the bundle: sequelize loads its dialect by name, argon2 is a native module.
  serverExternalPackages: ["sequelize", "pg", "pg-hstore", "pino", "@node-rs/argon2"],
  turbopack: { root: import.meta.dirname },
};

export default config;
