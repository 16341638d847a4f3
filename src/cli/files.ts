// All reading and writing of files: whole texts in, whole texts out, nothing half-written, every trouble a refusal.

import * as nodeFs from "node:fs";
import { dirname, join } from "node:path";
import { accepted, type Read } from "../quantity/index.ts";
import { codeOf, refuseFile as refuse, trouble } from "./fileTroubles.ts";

/** The part of node:fs that is used, so that a test can hand in a disk that fails. */
export type FileSystem = Pick<
  typeof nodeFs,
  | "openSync"
  | "closeSync"
  | "readSync"
  | "writeSync"
  | "fsyncSync"
  | "fstatSync"
  | "statSync"
  | "lstatSync"
  | "realpathSync"
  | "renameSync"
  | "linkSync"
  | "unlinkSync"
  | "chmodSync"
  | "watchFile"
  | "unwatchFile"
>;

export interface Files {
  /** Reads a text file, or standard input for `-`. */
  readonly read: (path: string) => Read<string>;
  /** Writes a whole file or nothing. An existing file is replaced only with `force`. */
  readonly write: (path: string, text: string, force: boolean) => Read<string>;
  /** Calls back after a file changed, until the function that it gives is called. */
  readonly watch: (path: string, changed: () => void) => () => void;
  /** Gives a file another name, whatever its bytes; what has that name is replaced. */
  readonly move: (path: string, to: string) => Read<string>;
}

/** Largest text that is read, bytes: a catalogue of a million rows has about 200 MB. */
export const LARGEST = 384 * 1024 * 1024;
const CHUNK = 1 << 20;
/** How often a watched file is looked at: by its state, which works on every disk and over every way of saving. */
const WATCH_MS = 500;

/** Reads to the end from an open file; null when it is larger than LARGEST. A pipe that has nothing yet is waited for. */
function readAll(fs: FileSystem, handle: number): Buffer | null {
  const chunks: Buffer[] = [];
  let size = 0;
  for (;;) {
    const chunk = Buffer.allocUnsafe(CHUNK);
    let count: number;
    try {
      count = fs.readSync(handle, chunk, 0, CHUNK, null);
    } catch (error) {
      if (codeOf(error) === "EOF") break;
      if (codeOf(error) !== "EAGAIN") throw error;
      Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, 5);
      continue;
    }
    if (count === 0) break;
    size += count;
    if (size > LARGEST) return null;
    chunks.push(chunk.subarray(0, count));
  }
  return Buffer.concat(chunks, size);
}

function decode(bytes: Buffer | null, file: string): Read<string> {
  if (bytes === null) return refuse("too-large", file, `more than ${LARGEST >> 20} MiB`, "a smaller file, or several");
  try {
    return accepted(new TextDecoder("utf-8", { fatal: true, ignoreBOM: true }).decode(bytes));
  } catch {
    const utf16 = (bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff);
    return refuse(
      "not-utf8",
      file,
      utf16 ? "text in UTF-16" : "bytes that are not UTF-8",
      "text saved as UTF-8 (in a spreadsheet: CSV UTF-8)",
    );
  }
}

function readText(fs: FileSystem, path: string): Read<string> {
  const standard = path === "-";
  const file = standard ? "standard input" : path;
  let handle: number | null = null;
  try {
    handle = standard ? 0 : fs.openSync(path, "r");
    if (!standard && fs.fstatSync(handle).isDirectory()) return trouble({ code: "EISDIR" }, file);
    return decode(readAll(fs, handle), file);
  } catch (error) {
    return trouble(error, file);
  } finally {
    if (handle !== null && !standard) fs.closeSync(handle);
  }
}

function writeAll(fs: FileSystem, handle: number, text: string): void {
  const bytes = Buffer.from(text, "utf8");
  let done = 0;
  while (done < bytes.length) done += fs.writeSync(handle, bytes, done, bytes.length - done);
}

/** Whether a thing stands at the path, and what: a link that leads nowhere counts as nothing there. */
function standing(fs: FileSystem, path: string): nodeFs.Stats | null {
  try {
    return fs.statSync(path);
  } catch (error) {
    if (codeOf(error) === "ENOENT") return null;
    throw error;
  }
}

/** Leftovers of earlier runs that are stepped over: a process that was killed may have had our number. */
const LEFTOVERS = 100;

/** Opens a new file beside the target. Its name is short, however long the target's is. */
function openBeside(fs: FileSystem, target: string): { readonly temporary: string; readonly handle: number } {
  for (let attempt = 0; ; attempt++) {
    const temporary = join(dirname(target), `.joulewright.${process.pid}.${attempt}.partial`);
    try {
      return { temporary, handle: fs.openSync(temporary, "wx", 0o666) };
    } catch (error) {
      if (codeOf(error) !== "EEXIST" || attempt === LEFTOVERS) throw error;
    }
  }
}

/** A new file beside the target, filled and flushed; removed again when that fails. */
function fillBeside(fs: FileSystem, target: string, text: string, mode: number | null): string {
  const { temporary, handle } = openBeside(fs, target);
  try {
    try {
      writeAll(fs, handle, text);
      fs.fsyncSync(handle);
    } finally {
      fs.closeSync(handle);
    }
    if (mode !== null) fs.chmodSync(temporary, mode & 0o7777);
  } catch (error) {
    fs.unlinkSync(temporary);
    throw error;
  }
  return temporary;
}

/** Gives the finished file its name; without `force` only if nothing has it, also when that happened a moment ago. */
function settle(fs: FileSystem, temporary: string, target: string, force: boolean): void {
  if (force) {
    fs.renameSync(temporary, target);
    return;
  }
  try {
    fs.linkSync(temporary, target);
  } catch (error) {
    // Some file systems have no hard links; there the look before must do.
    if (!["EPERM", "ENOTSUP", "EOPNOTSUPP", "ENOSYS"].includes(codeOf(error))) throw error;
    if (standing(fs, target) !== null) throw { code: "EEXIST" };
    fs.renameSync(temporary, target);
    return;
  }
  fs.unlinkSync(temporary);
}

function writeText(fs: FileSystem, path: string, text: string, force: boolean): Read<string> {
  let temporary: string | null = null;
  try {
    const there = standing(fs, path);
    if (there?.isDirectory()) return trouble({ code: "EISDIR" }, path);
    if (there !== null && !there.isFile()) {
      // A device or a pipe is written to, never replaced.
      const handle = fs.openSync(path, "w");
      try {
        writeAll(fs, handle, text);
      } finally {
        fs.closeSync(handle);
      }
      return accepted(path);
    }
    if (there !== null && !force) return trouble({ code: "EEXIST" }, path);
    // Through a link, the file that it names is replaced and the link stays.
    const target = there === null ? path : fs.realpathSync(path);
    temporary = fillBeside(fs, target, text, there?.mode ?? null);
    settle(fs, temporary, target, force);
    return accepted(path);
  } catch (error) {
    if (temporary !== null) {
      try {
        fs.unlinkSync(temporary);
      } catch {
        // It has its name already, or the folder is gone: the first trouble is the one to tell.
      }
    }
    return trouble(error, path);
  }
}

/** Reading and writing on a file system; standard input can be read once. */
export function filesOn(fs: FileSystem = nodeFs): Files {
  let used = false;
  return {
    read: (path) => {
      if (path !== "-") return readText(fs, path);
      if (used) return refuse("input-twice", "standard input", "a second -", "- once only");
      used = true;
      return readText(fs, path);
    },
    write: (path, text, force) => writeText(fs, path, text, force),
    watch: (path, changed) => {
      const listener = (now: nodeFs.Stats, before: nodeFs.Stats): void => {
        // A file that is gone is being replaced by its editor: the next look finds it.
        if (now.mtimeMs !== 0 && (now.mtimeMs !== before.mtimeMs || now.size !== before.size)) changed();
      };
      fs.watchFile(path, { interval: WATCH_MS, persistent: false }, listener);
      return () => fs.unwatchFile(path, listener);
    },
    move: (path, to) => {
      try {
        fs.renameSync(path, to);
        return accepted(to);
      } catch (error) {
        return trouble(error, path);
      }
    },
  };
}

/** Writes to the terminal at once, so that it is done even if the process ends next. Throws when the terminal is gone. */
export const writeNow = (text: string): void => {
  nodeFs.writeSync(1, text);
};
