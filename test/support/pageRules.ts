// By which rules pages are validated; every exception has its reason.
import type { RunOptions } from "axe-core";
import type { ConfigData } from "html-validate";

export const RECOMMENDED: ConfigData = {
  extends: ["html-validate:recommended"],
  rules: {
    // The serialiser closes void elements as XML does; HTML allows it.
    "void-style": ["error", { style: "selfclose" }],
    // The length of a title is a matter of search engines; this one carries the layout's name.
    "long-title": "off",
  },
};

/** Contrast needs a layout, which a page in a test has not; the paper is black on white by its style. */
export const UNLAID: RunOptions = { resultTypes: ["violations"], rules: { "color-contrast": { enabled: false } } };
