// Stands for the `server-only` marker package, which refuses to load outside a React server build.
export {};
