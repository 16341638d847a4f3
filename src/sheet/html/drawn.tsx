/** @jsxImportSource preact */
// A drawing of the sheet as its picture.

import type { Drawn as DrawnData } from "../model.ts";

export function Drawn({ drawn }: { readonly drawn: DrawnData }) {
  return <p>{drawn.props.title}</p>;
}
