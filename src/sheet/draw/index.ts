// Drawings, charts and labels of the sheet: what each is drawn from, and the figures made of it.
export { type BleedChartProps, bleedFigures } from "./bleedChart.tsx";
export type { BleedCurve, BleedPoint } from "./bleedCurves.ts";
export { type CostChartProps, costFigures } from "./costChart.tsx";
export { type CostStep, costSteps } from "./costSteps.ts";
export { type Figure, PAGE } from "./drawing.tsx";
export { faceFigures } from "./face.tsx";
export { FACE_PIECE, type FaceProps, type PieceSize } from "./facePlan.ts";
export { LABEL_PAPERS, type Label, type LabelPaper } from "./label.ts";
export { type LabelsProps, labelFigures } from "./labels.tsx";
export { MOST_UNITS, schematicFigures } from "./schematic.tsx";
export type { DrawnBalance, DrawnLoad, DrawnResistor, Earth, Isolation, SchematicProps } from "./schematicProps.ts";
export { type ShotChartProps, type ShotSample, shotFigures } from "./shotChart.tsx";
export type { LimitLine, VoltageBar } from "./voltageBars.ts";
export { type VoltageChartProps, voltageFigures } from "./voltageChart.tsx";
