// The one place where a tree of elements becomes text: everything escaped, nothing hidden left in it.
//
// preact is here for that escaping: what a file brings can reach the page only as text or as a quoted attribute. It escapes
// what HTML needs; direction marks, controls and other unseen characters are written out as everywhere on paper, and "]]>" is
// broken, which XML does not allow in text.

import type { VNode } from "preact";
import { renderToString } from "preact-render-to-string";
import { visibleLines } from "../order/index.ts";

/** Markup as text. Same tree, same bytes. */
export const rendered = (vnode: VNode): string => visibleLines(renderToString(vnode)).replaceAll("]]>", "]]&gt;");
