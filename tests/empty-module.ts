/** Stands in for `server-only` where there is no React server bundle: in tests. */
export {};
