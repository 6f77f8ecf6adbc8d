// Stands in for the `server-only` marker outside Next (tests, seed, commands), where its own entry always throws.
export {};
