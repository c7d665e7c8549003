import { writeFileSync } from 'node:fs';

/**
 * Writes `docs/performance.md` from what a run of the bench printed.
 *
 * @param said its lines, the first with date, processor, Node and commit
 */
export function keepPage(said: readonly string[]): void {
  writeFileSync(
    'docs/performance.md',
    `# Performance

Written by \`npm run bench -- --keep\` on the machine named in the first line. All candidates of a table are timed in turn in one
run; figures are medians. Compare ratios, not times: a machine that is busy is slower for all of them.

\`\`\`text
${said.join('\n')}
\`\`\`

| what | held against | asked |
|---|---|---|
| a prepared year with everything on | a plain C loop of the same year (\`bench/c/year.c\`, \`gcc -O3 -march=native\`), which must come to the same electricity | at most its time |
| a house with mass, second pass and start-up included | the same C loop, which has no mass | at most 1.2 times |
| hot water and mass | the demo's year without them | at most 2 times |
| one more tariff | the year that it prices | at most 5 % |
| reading a year of weather | papaparse alone on that text, which finds cells and no more | at most 2 times |
| preparing weather, laying a tariff | | at most 3 ms each |
| \`--help\` | \`node -e 0\`, whole processes | at most 1.4 times |
| \`simulate\` of the demo | the same | at most 2.5 times |
| batch on two workers | on one | at least 1.7 times, on two free cores |
| batch on two workers | two programs at once, each on its half | as much |
| many options of one home on two workers | two loops of hours, months and totals and nothing else | at least 80 % |
| peak memory of a large batch | of a small one | at most 1.2 times |
| what is neither simulation nor pricing in a job | the job | at most 30 % |

The hours run in two loops (\`src/sim/roomsKernel.ts\`, \`src/sim/waterKernel.ts\`) that leave the same bytes as the stages; a test
holds that on random plans. The power of the emitters is a table with a binomial series whose first dropped term is below 1e-16
(\`src/core/power.ts\`). A cold
\`simulate\` is not where it is wanted: most of it is reading CSV and YAML before the compiler has warmed up.
`,
  );
}
