// Text that means harm to a page, a drawing, a table or a terminal, as it may stand in any file that is read.

export const ATTACKS: readonly string[] = [
  "<script>alert(1)</script>",
  "</script><script>alert(1)</script>",
  "</style><img src=x onerror=alert(1)>",
  '"><svg onload=alert(1)>',
  "<svg><g/onload=alert(1)//<p>",
  "' onmouseover='alert(1)",
  "]]><x/>",
  "--><script>alert(1)</script>",
  "javascript:alert(1)",
  "[click](javascript:alert(1))",
  "![x](http://x.invalid/y.png)",
  "| a | b |\n| --- | --- |",
  "</td></tr></table><h1>gone",
  "=cmd|' /C calc'!A0",
  "@SUM(1+1)",
  "# not a heading",
  "&lt;b&gt; &amp; &#60;i&#62;",
  "\u202eevil\u2066",
  "a\u0000b\u0007c",
  "\ud800",
];
