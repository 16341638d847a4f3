// One element for each item of a list. A page is drawn once, as text, so no item needs a key to be found again by.

import type { VNode } from "preact";

export const each = <T>(items: readonly T[], draw: (item: T, index: number) => VNode): VNode[] => items.map(draw);
