// Makes the demo's weather and prices anew: bundles scripts/demo into dist/ and runs it in the project's folder.
import { pathToFileURL } from 'node:url';
import { build } from 'esbuild';

const outfile = 'dist/demoData.js';
await build({
  entryPoints: ['scripts/demo/main.ts'],
  outfile,
  bundle: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  banner: { js: "import{createRequire as __cr}from'node:module';const require=__cr(import.meta.url);" },
});
await import(pathToFileURL(outfile).href);
