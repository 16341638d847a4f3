// The terminal screens: draws, takes keys, and reaches everything else through ports.

export type {
  Arrangement,
  EnginePort,
  PlanRequest,
  SaveAnswer,
  ScreenPorts,
  StockFacts,
} from "./ports.ts";
export { type ScreenFlags, screenFlags } from "./screenFlags.ts";
export { openScreens } from "./screens.ts";
export { type StartOptions, startScreens } from "./start.ts";
export { screenTrouble } from "./terminal.ts";
