/**
 * Mutants of one folder of shared/.
 *
 * @param tests patterns of the tests to run, one after the other; all the rest where these say nothing
 * @param rows file, the text to find (once), what stands there instead
 */
export function group(folder, tests, rows) {
  return rows.map(([file, find, replace]) => ({
    file: `shared/${folder}/${file}.ts`,
    find,
    replace,
    tests,
  }));
}
