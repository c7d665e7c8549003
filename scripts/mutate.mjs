// Bundles scripts/mutate/main.ts into dist/ and runs it; arguments are handed on.
import { spawnSync } from 'node:child_process';
import { build } from 'esbuild';

await build({
  entryPoints: ['scripts/mutate/main.ts'],
  outfile: 'dist/mutate.mjs',
  bundle: true,
  packages: 'external',
  platform: 'node',
  format: 'esm',
  target: 'node20',
});
const { status } = spawnSync(process.execPath, ['dist/mutate.mjs', ...process.argv.slice(2)], { stdio: 'inherit' });
process.exitCode = status ?? 1;
