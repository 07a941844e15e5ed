/** Stands in for the `server-only` marker, which refuses to load outside a server bundle. */
export {}
