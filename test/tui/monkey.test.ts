// A short run of random keys; the long one is a campaign of its own.
import { expect, test } from "vitest";
import { runMonkey } from "../support/monkey.ts";

test("1,500 random keys at random sizes: nothing thrown, nothing outside, no stale cell, all saved whole", async () => {
  const { faults, screens } = await runMonkey(8, 1500, 40);
  expect(faults).toEqual([]);
  // The run is worth something only if it got about.
  const wanted = [
    "bank",
    "brief",
    "compare",
    "layouts",
    "order",
    "brief+help",
    "bank+help",
    "order+prompt",
    "sharing",
    "shot",
    "map",
    "parts",
    "trail",
    "parts+prompt",
    "blend",
    "blend found",
  ];
  const stages = [
    "compare listed 2",
    "bank listed 0",
    "layouts empty 0",
    "sharing with key rest margin spread",
    "shot with key shot",
  ];
  expect([...wanted, ...stages].filter((name) => !screens.has(name))).toEqual([]);
}, 120_000);
