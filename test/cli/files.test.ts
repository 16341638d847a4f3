// On a real disk in a temporary folder; troubles that root does not meet come from a file system that fails.
import * as fs from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { type FileSystem, filesOn, LARGEST } from "../../src/cli/files.ts";
import type { Read } from "../../src/quantity/index.ts";

let folder = "";
beforeEach(() => {
  folder = fs.mkdtempSync(join(tmpdir(), "joulewright-"));
});
afterEach(() => fs.rmSync(folder, { recursive: true, force: true }));

const files = filesOn();
const codeOf = (read: Read<unknown>): string => (read.ok ? "" : (read.refusals[0]?.code ?? ""));
const failing = (name: keyof FileSystem, code: string): FileSystem => ({
  ...fs,
  [name]: () => {
    throw Object.assign(new Error(code), { code });
  },
});
const left = (): string[] => fs.readdirSync(folder).sort();

describe("read(path)", () => {
  test("the whole text, byte-order mark and all", () => {
    const path = join(folder, "a.csv");
    fs.writeFileSync(path, "\ufeffpart\nµ");
    expect(files.read(path)).toEqual({ ok: true, value: "\ufeffpart\nµ" });
  });

  test("an empty file is an empty text", () => {
    const path = join(folder, "a");
    fs.writeFileSync(path, "");
    expect(files.read(path)).toEqual({ ok: true, value: "" });
  });

  test("missing, a folder, a file used as a folder, a name too long, a loop of links", () => {
    fs.writeFileSync(join(folder, "a"), "");
    fs.symlinkSync(join(folder, "loop"), join(folder, "loop"));
    expect(codeOf(files.read(join(folder, "none")))).toBe("no-such-file");
    expect(codeOf(files.read(folder))).toBe("is-directory");
    expect(codeOf(files.read(join(folder, "a", "b")))).toBe("no-such-file");
    expect(codeOf(files.read(join(folder, "x".repeat(300))))).toBe("bad-path");
    expect(codeOf(files.read(join(folder, "loop")))).toBe("bad-path");
  });

  test("Latin-1 and UTF-16 are refused, UTF-16 by name", () => {
    const path = join(folder, "a");
    fs.writeFileSync(path, Buffer.from([0x61, 0xb5, 0x46]));
    expect(codeOf(files.read(path))).toBe("not-utf8");
    fs.writeFileSync(path, Buffer.from("\ufeffpart", "utf16le"));
    const read = files.read(path);
    expect(codeOf(read)).toBe("not-utf8");
    expect(read.ok ? "" : read.refusals[0]?.read).toMatch(/UTF-16/);
  });

  test("a character cut between two reads of a megabyte is whole", () => {
    const path = join(folder, "a");
    const text = `${"a".repeat((1 << 20) - 1)}µ${"b".repeat(10)}`;
    fs.writeFileSync(path, text);
    const read = files.read(path);
    expect(read.ok && read.value === text).toBe(true);
  });

  test("no permission and a broken disk (simulated: root may read everything)", () => {
    expect(codeOf(filesOn(failing("openSync", "EACCES")).read("a"))).toBe("no-permission");
    fs.writeFileSync(join(folder, "a"), "x");
    expect(codeOf(filesOn(failing("readSync", "EIO")).read(join(folder, "a")))).toBe("unreadable");
  });

  test("too large is refused without being kept (simulated: an endless file)", () => {
    let given = 0;
    const endless: FileSystem = {
      ...fs,
      readSync: ((_fd: number, buffer: Buffer) => {
        given += buffer.length;
        return buffer.length;
      }) as FileSystem["readSync"],
    };
    fs.writeFileSync(join(folder, "a"), "x");
    expect(codeOf(filesOn(endless).read(join(folder, "a")))).toBe("too-large");
    expect(given).toBeLessThan(LARGEST * 1.01);
  });

  test("standard input once, a pipe that has nothing yet is waited for, a closed one is refused", () => {
    const answers = ["EAGAIN", "EAGAIN", "hello", ""];
    const slow: FileSystem = {
      ...fs,
      readSync: ((_fd: number, buffer: Buffer) => {
        const answer = answers.shift() ?? "";
        if (answer === "EAGAIN") throw Object.assign(new Error(answer), { code: answer });
        return buffer.write(answer);
      }) as FileSystem["readSync"],
    };
    const once = filesOn(slow);
    expect(once.read("-")).toEqual({ ok: true, value: "hello" });
    expect(codeOf(once.read("-"))).toBe("input-twice");
    expect(codeOf(filesOn(failing("readSync", "EBADF")).read("-"))).toBe("no-input");
  });

  test("a bug of ours is not made a refusal", () => {
    const broken: FileSystem = {
      ...fs,
      openSync: () => {
        throw new TypeError("ours");
      },
    };
    expect(() => filesOn(broken).read("a")).toThrow("ours");
  });
});

describe("write(path, text, force)", () => {
  test("a new file, and nothing beside it", () => {
    const path = join(folder, "a.csv");
    expect(files.write(path, "µ\n", false)).toEqual({ ok: true, value: path });
    expect(fs.readFileSync(path, "utf8")).toBe("µ\n");
    expect(left()).toEqual(["a.csv"]);
  });

  test("an existing file stays as it is without force, and is replaced whole with it, mode kept", () => {
    const path = join(folder, "a");
    fs.writeFileSync(path, "old", { mode: 0o640 });
    expect(codeOf(files.write(path, "new", false))).toBe("file-exists");
    expect(fs.readFileSync(path, "utf8")).toBe("old");
    expect(files.write(path, "new", true).ok).toBe(true);
    expect(fs.readFileSync(path, "utf8")).toBe("new");
    expect(fs.statSync(path).mode & 0o777).toBe(0o640);
    expect(left()).toEqual(["a"]);
  });

  test("a name as long as the system allows, in bytes, and a leftover with our number in the way", () => {
    const path = join(folder, `${"電".repeat(83)}.csv`);
    fs.writeFileSync(join(folder, `.joulewright.${process.pid}.0.partial`), "theirs");
    expect(files.write(path, "new", false).ok).toBe(true);
    expect(fs.readFileSync(path, "utf8")).toBe("new");
    expect(left()).toHaveLength(2);
  });

  test("a file that appears while the text is written is not replaced", () => {
    const path = join(folder, "a");
    const racing: FileSystem = {
      ...fs,
      fsyncSync: (handle) => {
        fs.writeFileSync(path, "theirs");
        fs.fsyncSync(handle);
      },
    };
    expect(codeOf(filesOn(racing).write(path, "ours", false))).toBe("file-exists");
    expect(fs.readFileSync(path, "utf8")).toBe("theirs");
    expect(left()).toEqual(["a"]);
  });

  test("without hard links the file is still written, and still not over another", () => {
    const path = join(folder, "a");
    expect(filesOn(failing("linkSync", "EPERM")).write(path, "x", false).ok).toBe(true);
    expect(left()).toEqual(["a"]);
    expect(codeOf(filesOn(failing("linkSync", "EPERM")).write(path, "y", false))).toBe("file-exists");
  });

  test("through a link the file it names is replaced and the link stays; a link to nothing is refused", () => {
    fs.writeFileSync(join(folder, "real"), "old");
    fs.symlinkSync(join(folder, "real"), join(folder, "link"));
    expect(files.write(join(folder, "link"), "new", true).ok).toBe(true);
    expect(fs.lstatSync(join(folder, "link")).isSymbolicLink()).toBe(true);
    expect(fs.readFileSync(join(folder, "real"), "utf8")).toBe("new");
    fs.symlinkSync(join(folder, "gone"), join(folder, "dangling"));
    expect(codeOf(files.write(join(folder, "dangling"), "x", false))).toBe("file-exists");
    expect(left()).toEqual(["dangling", "link", "real"]);
  });

  test("a folder, and a folder that is missing", () => {
    expect(codeOf(files.write(folder, "x", true))).toBe("is-directory");
    expect(codeOf(files.write(join(folder, "no", "a"), "x", false))).toBe("no-such-file");
  });

  test("a full disk: refused, the old file whole, nothing left behind (a real full device, then simulated)", () => {
    expect(codeOf(files.write("/dev/full", "x", true))).toBe("disk-full");
    expect(fs.statSync("/dev/full").isCharacterDevice()).toBe(true);
    const path = join(folder, "a");
    fs.writeFileSync(path, "old");
    for (const name of ["writeSync", "fsyncSync", "renameSync"] as const) {
      expect(codeOf(filesOn(failing(name, "ENOSPC")).write(path, "new", true)), name).toBe("disk-full");
      expect(fs.readFileSync(path, "utf8")).toBe("old");
      expect(left(), name).toEqual(["a"]);
    }
  });

  test("a write in small pieces ends with the whole text", () => {
    const path = join(folder, "a");
    const sparing: FileSystem = {
      ...fs,
      writeSync: ((handle: number, bytes: Buffer, offset: number, length: number) =>
        fs.writeSync(handle, bytes, offset, Math.min(3, length))) as FileSystem["writeSync"],
    };
    expect(filesOn(sparing).write(path, "0123456789", false).ok).toBe(true);
    expect(fs.readFileSync(path, "utf8")).toBe("0123456789");
  });

  test("read-only folder and no permission (simulated: root may write everywhere)", () => {
    expect(codeOf(filesOn(failing("openSync", "EROFS")).write(join(folder, "a"), "x", false))).toBe("read-only");
    expect(codeOf(filesOn(failing("openSync", "EACCES")).write(join(folder, "a"), "x", false))).toBe("no-permission");
    expect(left()).toEqual([]);
  });
});

describe("move(path, to)", () => {
  test("another name for the same bytes, over what had it; a file that is not there is told", () => {
    fs.writeFileSync(join(folder, "a"), Buffer.from([0xff, 0xfe, 0x00]));
    fs.writeFileSync(join(folder, "b"), "old");
    expect(files.move(join(folder, "a"), join(folder, "b"))).toEqual({ ok: true, value: join(folder, "b") });
    expect([...fs.readFileSync(join(folder, "b"))]).toEqual([0xff, 0xfe, 0x00]);
    expect(left()).toEqual(["b"]);
    expect(codeOf(files.move(join(folder, "a"), join(folder, "c")))).toBe("no-such-file");
  });
});

describe("watch(path, changed)", () => {
  test("calls back after the file has changed, also by being replaced; not after it was stopped", async () => {
    const path = join(folder, "a.csv");
    fs.writeFileSync(path, "one");
    let called = 0;
    const stop = files.watch(path, () => {
      called += 1;
    });
    const until = async (count: number): Promise<void> => {
      for (let waited = 0; called < count && waited < 6000; waited += 50) await new Promise((go) => setTimeout(go, 50));
      expect(called).toBe(count);
    };
    await new Promise((go) => setTimeout(go, 100));
    fs.writeFileSync(join(folder, "b"), "another");
    fs.renameSync(join(folder, "b"), path);
    await until(1);
    stop();
    fs.writeFileSync(path, "a third time");
    await new Promise((go) => setTimeout(go, 700));
    expect(called).toBe(1);
  }, 10_000);
});
