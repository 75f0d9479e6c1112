import type { NextConfig } from "next";

const config: NextConfig = {
  // Native code and process pools cannot be bundled.
  serverExternalPackages: ["knex", "better-sqlite3", "@node-rs/argon2", "workerpool", "nodemailer"],
  poweredByHeader: false,
  reactStrictMode: true,
};

export default config;
