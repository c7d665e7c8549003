// Writes what follows from the schemas: docs/formats.md and schemas/*.json. Bundles scripts/generate.ts into dist/ and runs
// it in the project's folder.
import { pathToFileURL } from 'node:url';
import { build } from 'esbuild';

const outfile = 'dist/generate.js';
await build({
  entryPoints: ['scripts/generate.ts'],
  outfile,
  bundle: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  banner: { js: "import{createRequire as __cr}from'node:module';const require=__cr(import.meta.url);" },
});
await import(pathToFileURL(outfile).href);
