// The version that `--version` prints; a test holds it against the package's own.

export const VERSION = "0.1.0";
