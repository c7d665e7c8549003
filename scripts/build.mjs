// Bundles the program into dist/: one small entry and a chunk per command, so that `--help` loads next to nothing.
import { rmSync } from 'node:fs';
import { build } from 'esbuild';

rmSync('dist', { recursive: true, force: true });
await build({
  // the worker threads of a batch have an entry of their own
  entryPoints: { main: 'cli/main.ts', batchWorker: 'cli/batch/worker.ts' },
  // it starts threads by files of its own, so it stays a package
  external: ['piscina'],
  outdir: 'dist',
  bundle: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  minify: true,
  splitting: true,
  banner: {
    js: "#!/usr/bin/env node\nimport{createRequire as __cr}from'node:module';const require=__cr(import.meta.url);",
  },
});
