// Which tests a mutant meets: those of its layer, or with ONE=layer/file that file's own alone (ALSO adds others, parted by commas).
// The mutation tester's own choice of test files leaves what runs on import unmutated (9.6.1), so the choice is made here.
const { ONE: one, ALSO: also = "" } = process.env;
const files = one === undefined ? ["**"] : [one, ...also.split(",").filter(Boolean)];

export default { test: { include: files.map((file) => `**/${file}.test.{ts,tsx}`), exclude: [] } };
