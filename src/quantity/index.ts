// What the layers above may use of quantity.
export * from "./finding.ts";
export * from "./refusal.ts";
