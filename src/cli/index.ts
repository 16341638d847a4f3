// The command line: the program, its ports, and the words that the screens share.
export { EXIT } from "./exit.ts";
export { type Files, filesOn } from "./files.ts";
export { type Ports, textWidth } from "./ports.ts";
