// Builds the sheet: one HTML page that holds everything, dist/sheet.html. It fetches nothing, so its policy allows nothing but
// its own script and style, named by their hashes, and its worker.
import { createHash } from 'node:crypto';
import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { build } from 'vite';
import { viteSingleFile } from 'vite-plugin-singlefile';

const root = fileURLToPath(new URL('../web', import.meta.url));
const dist = fileURLToPath(new URL('../dist', import.meta.url));

/** The charts of the report bring their own style along. */
const chartStyle = /`([\s\S]*)`/.exec(
  readFileSync(new URL('../src/report/charts/chartStyle.ts', import.meta.url), 'utf8'),
)[1];
const page = `${dist}/sheet.html`;

const chartLook = {
  name: 'chart-style',
  enforce: 'pre',
  transform(code, id) {
    return id.endsWith('/sheet.css') ? `${code}${chartStyle}` : undefined;
  },
};

const jsx = { oxc: { jsx: { runtime: 'automatic', importSource: 'preact' } } };
await build({
  root,
  configFile: false,
  logLevel: 'error',
  ...jsx,
  plugins: [chartLook, viteSingleFile({ removeViteModuleLoader: true })],
  worker: { format: 'iife' },
  build: {
    outDir: `${dist}/sheet`,
    emptyOutDir: true,
    target: 'es2022',
    modulePreload: false,
    chunkSizeWarningLimit: 4000,
  },
});

const built = readFileSync(`${dist}/sheet/index.html`, 'utf8');
rmSync(`${dist}/sheet`, { recursive: true });

/** What stands in the page between two tags; the style is the last one, for the script speaks of styles too. */
function inlined(tag, from) {
  const begin = built.indexOf('>', from) + 1;
  return built.slice(begin, built.indexOf(`</${tag}>`, begin));
}
const hashOf = (text) => `'sha256-${createHash('sha256').update(text).digest('base64')}'`;
const script = hashOf(inlined('script', built.indexOf('<script')));
const style = hashOf(inlined('style', built.lastIndexOf('<style')));
const policy = [
  "default-src 'none'",
  `script-src ${script}`,
  `style-src ${style}`,
  'worker-src blob:',
  'img-src data:',
  "connect-src 'none'",
  "form-action 'none'",
  "base-uri 'none'",
].join('; ');
writeFileSync(
  page,
  built.replace(
    '<meta charset',
    () => `<meta http-equiv="Content-Security-Policy" content="${policy}" /><meta charset`,
  ),
);
