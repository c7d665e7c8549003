// Takes the picture of the report's first page for the README: bundles scripts/reportPicture.ts into dist/ and runs it in
// the project's folder.
import { pathToFileURL } from 'node:url';
import { build } from 'esbuild';

const outfile = 'dist/reportPicture.js';
await build({
  entryPoints: ['scripts/reportPicture.ts'],
  outfile,
  bundle: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  external: ['playwright-core'],
  banner: { js: "import{createRequire as __cr}from'node:module';const require=__cr(import.meta.url);" },
});
await import(pathToFileURL(outfile).href);
