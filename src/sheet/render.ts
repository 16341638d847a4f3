// The one place where a tree of elements becomes text: everything escaped, nothing hidden left in it.

import type { VNode } from "preact";
import { renderToString } from "preact-render-to-string";
import { visibleLines } from "../order/index.ts";

/** Markup as text. */
export const rendered = (vnode: VNode): string => visibleLines(renderToString(vnode)).replaceAll("]]>", "]]&gt;");
