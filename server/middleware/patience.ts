/** Goes into a statement on a request's way: a database that hangs must not hold the answers. */
export const patience = { query_timeout: 5_000 } as const;
