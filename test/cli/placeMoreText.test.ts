import { expect, test } from "vitest";
import { cli, SMALL, SMALL_ARGV } from "../support/placeCli.ts";

test("resistors, front and mending are told when there is something to tell", async () => {
  const more = await cli([...SMALL_ARGV, "--front", "--without", "u3"], { "lot.csv": SMALL });
  expect(more.out).toMatch(
    /Effect of the balancing resistors[\s\S]*none +[\d.]+ % +[\d.]+ %[\s\S]*300 kohm[\s\S]*33\.33 kohm/,
  );
  expect(more.out).toMatch(/Charging against holding, exact: every placing was looked at/);
  expect(more.out.match(/balanced: the greater of the two is least/g)?.length).toBe(1);
  expect(more.out).toMatch(/When u3 comes out[\s\S]*1 position changed/);
  const plain = await cli([...SMALL_ARGV, "--balance", "none"], { "lot.csv": SMALL });
  expect(plain.out).not.toMatch(/Effect of|Charging against|comes out/);
});
