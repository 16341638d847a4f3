import { expect, test } from "vitest";
import { HELP } from "../../src/cli/helpText.ts";

test("HELP: every page has examples and the exit statuses", () => {
  for (const [page, text] of Object.entries(HELP)) {
    expect(text, page).toMatch(/Examples:\n {2}\$ joulewright /);
    expect(text, page).toMatch(/Exit status: 0 .* 1 .* 2 .* 70 /);
  }
});
