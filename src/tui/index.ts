// The terminal screens: draws, takes keys, and reaches everything else through ports.
export type {
  Arrangement,
  BillLine,
  BillView,
  BriefValues,
  EnginePort,
  LayoutView,
  PlanRequest,
  PlanView,
  SaveAnswer,
  ScreenPorts,
  StockFacts,
} from "./ports.ts";
export { openScreens } from "./screens.ts";
export { screenTrouble } from "./terminal.ts";
