// The terminal screens: draws, takes keys, and reaches everything else through ports.

export { catalogEngine, type Stock } from "./catalogEngine.ts";
export type {
  Arrangement,
  BillLine,
  BillView,
  EnginePort,
  PlanRequest,
  SaveAnswer,
  ScreenPorts,
  StockFacts,
} from "./ports.ts";
export { openScreens } from "./screens.ts";
export { screenTrouble } from "./terminal.ts";
