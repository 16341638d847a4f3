// What the operating system says about a file, as refusals.

import { type Read, type Refusal, refused } from "../quantity/index.ts";

/** Codes of the operating system and the refusals they mean. */
const TROUBLES: Readonly<Record<string, readonly [code: string, want: string]>> = {
  ENOENT: ["no-such-file", "the path of a file that exists, in a folder that exists"],
  ENOTDIR: ["no-such-file", "a path whose folders are folders"],
  EISDIR: ["is-directory", "a file, not a folder"],
  EACCES: ["no-permission", "a place that you may use"],
  EPERM: ["no-permission", "a place that you may use"],
  EROFS: ["read-only", "a place that can be written to"],
  ENOSPC: ["disk-full", "room on the disk"],
  EDQUOT: ["disk-full", "room within your quota"],
  EEXIST: ["file-exists", "another name, or --force to replace it"],
  ENAMETOOLONG: ["bad-path", "a shorter name"],
  ELOOP: ["bad-path", "a link that does not point to itself"],
  EBADF: ["no-input", "standard input that is open"],
};

/** Code of a system error; empty for anything else. */
export const codeOf = (error: unknown): string => String((error as { code?: unknown } | null)?.code ?? "");

/** A system error as a refusal; what is no system error is thrown on, because it is a bug. */
export function trouble(error: unknown, file: string): Read<never> {
  const code = codeOf(error);
  const known = TROUBLES[code];
  if (known === undefined && code === "") throw error;
  const [name, want] = known ?? ["unreadable", "a file that the system can read and write"];
  return refused({ code: name, place: { file }, read: `the system's answer ${code}`, want });
}

export const refuseFile = (code: string, file: string, read: string, want: string): Read<never> =>
  refused({ code, place: { file }, read, want } satisfies Refusal);
