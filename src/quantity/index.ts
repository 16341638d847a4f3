// Contents page of quantity.
export type { BankState, Finding, Verdict } from "./finding.ts";
export type { Place, Read, Refusal } from "./refusal.ts";
export { accepted, refused } from "./refusal.ts";
