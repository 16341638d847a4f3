// Real shells on this machine, and what they answer to a Tab.
import { spawnSync } from "node:child_process";
import { spawn } from "@lydell/node-pty";

export const has = (shell: string): boolean => spawnSync(shell, ["--version"], { stdio: "ignore" }).status === 0;

/** What was written, without its colours and movements. */
const plain = (text: string): string => text.replace(/\x1b(\[[0-9;?]*[a-zA-Z]|[=>])/g, "");

/** Types into an interactive shell until it answers; everything that it showed. */
export async function typed(
  shell: string,
  args: readonly string[],
  lines: readonly { readonly send: string; readonly until: RegExp }[],
  cwd: string,
): Promise<string> {
  const terminal = spawn(shell, [...args], {
    cols: 200,
    rows: 50,
    cwd,
    env: { PATH: process.env.PATH ?? "", TERM: "xterm", HOME: cwd, LANG: "C.UTF-8" },
  });
  let all = "";
  let seen = "";
  terminal.onData((data) => {
    all += data;
    seen += data;
  });
  try {
    for (const { send, until } of lines) {
      seen = "";
      terminal.write(send);
      const end = performance.now() + 15_000;
      while (!until.test(plain(seen))) {
        if (performance.now() > end) throw new Error(`no ${until} in ${JSON.stringify(seen)}`);
        await new Promise((resolve) => setTimeout(resolve, 20));
      }
    }
    return plain(all);
  } finally {
    terminal.kill("SIGKILL");
  }
}
