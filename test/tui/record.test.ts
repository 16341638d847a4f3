import { describe, expect, test } from "vitest";
import { accepted, refused } from "../../src/quantity/index.ts";
import { recordReader } from "../../src/tui/record.ts";

const GOOD = "time [ms],current [A]\n0,0\n1,100\n2,0\n";

/** Files by name, and how often one was read. */
function files(texts: Record<string, string>) {
  let reads = 0;
  const read = (path: string) => {
    reads++;
    const text = texts[path];
    return text === undefined
      ? refused({ code: "no-file", place: { file: path }, read: path, want: "a file that can be read" })
      : accepted(text);
  };
  return { read, reads: () => reads, texts };
}

describe("recordReader(files)(input)", () => {
  test("the file named is read in its place, in SI; no load, and samples already there, pass through", () => {
    const read = recordReader(files({ "shot.csv": GOOD }));
    const whole = read({ energy: 1, load: { recorded: " shot.csv " } });
    expect(whole.ok ? whole.value.load : null).toEqual({
      recorded: [
        [0, 0],
        [0.001, 100],
        [0.002, 0],
      ],
    });
    const plain = { load: { recorded: [[0, 1]] } };
    expect(read(plain)).toEqual(accepted(plain));
    expect(read({})).toEqual(accepted({}));
  });

  test("no such file, a row that cannot be read and standard input are refused at the field", () => {
    const read = recordReader(files({ "bad.csv": "time [ms],current [A]\n0,none\n" }));
    for (const recorded of ["gone.csv", "bad.csv", "-"]) {
      const found = read({ load: { recorded } });
      expect(found.ok, recorded).toBe(false);
      if (!found.ok) for (const { place } of found.refusals) expect(place.field).toBe("load.recorded");
    }
  });

  test("a file that changed is read anew, one that did not gives the same samples again", () => {
    const disk = files({ "shot.csv": GOOD });
    const read = recordReader(disk);
    const samples = () => {
      const found = read({ load: { recorded: "shot.csv" } });
      return found.ok ? (found.value.load as { recorded: unknown }).recorded : null;
    };
    const first = samples();
    expect(samples()).toBe(first);
    disk.texts["shot.csv"] = GOOD.replace("100", "50");
    expect(samples()).toEqual([
      [0, 0],
      [0.001, 50],
      [0.002, 0],
    ]);
    expect(disk.reads()).toBe(3);
  });
});
