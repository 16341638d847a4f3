// The exit statuses, by what they mean.

export const EXIT = {
  done: 0,
  /** No layout possible, or a check failed. */
  unsafe: 1,
  /** Wrong use, or input that cannot be read. */
  wrongUse: 2,
  /** A bug of ours. */
  bug: 70,
} as const;
