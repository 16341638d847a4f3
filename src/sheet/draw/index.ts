// Drawings, charts and labels of the sheet: what each is drawn from, and the figures made of it.
export type {
  BleedChartProps,
  BleedCurve,
  CostChartProps,
  CostStep,
  LimitLine,
  ShotChartProps,
  ShotSample,
  VoltageBar,
  VoltageChartProps,
} from "./chartProps.ts";
export { type Figure, PAGE } from "./drawing.tsx";
export { faceFigures } from "./face.tsx";
export { FACE_PIECE, type FaceProps, type PieceSize } from "./facePlan.ts";
export type { Label, LabelsProps } from "./label.ts";
export { MOST_UNITS, schematicFigures } from "./schematic.tsx";
export type { DrawnBalance, DrawnLoad, DrawnResistor, Earth, Isolation, SchematicProps } from "./schematicProps.ts";
