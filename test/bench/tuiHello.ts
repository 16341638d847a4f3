// The yardstick of the first frame: the least that the same ink can show.
import { render, Text } from "ink";
import { createElement } from "react";

render(createElement(Text, null, "hello, world"));
setTimeout(() => {}, 60_000);
