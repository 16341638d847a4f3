// A pretended keyboard and a pretended process, for tests of what owns the terminal.
import { EventEmitter } from "node:events";

export class FakeKeyboard extends EventEmitter {
  readonly isTTY = true;
  raw = false;
  flowing = false;

  setRawMode(on: boolean): void {
    this.raw = on;
  }
  resume(): void {
    this.flowing = true;
  }
  pause(): void {
    this.flowing = false;
  }
  type(text: string): void {
    this.emit("data", Buffer.from(text, "utf8"));
  }
}

/** Records signals sent; `send` delivers one as the system would. */
export class FakeProcess extends EventEmitter {
  readonly pid = 4321;
  readonly sent: string[] = [];
  readonly platform: string;

  constructor(platform = "linux") {
    super();
    this.platform = platform;
  }
  kill(_pid: number, signal: string): void {
    this.sent.push(signal);
  }
  send(signal: string, fact?: unknown): void {
    this.emit(signal, fact);
  }
}
