import type { NextConfig } from "next";

const config: NextConfig = {
  // Native code and process pools cannot be bundled.
  serverExternalPackages: ["knex", "better-sqlite3", "@node-rs/argon2", "workerpool", "nodemailer"],
  // Everything else gets its headers in proxy.ts.
  headers: async () => [
    {
      source: "/(_next/static|fonts)/:path*",
      headers: [{ key: "x-content-type-options", value: "nosniff" }],
    },
  ],
  poweredByHeader: false,
  reactStrictMode: true,
};

export default config;
