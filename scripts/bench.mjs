// npm run bench: every figure as one JSON line {"name","value","unit","aim","reference"}.
import fs from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { installDebianPackages, installPackages } from './set-up.mjs';
import { root } from './root.mjs';

installPackages();
installDebianPackages(['postgresql', 'chromium']);
const { build } = await import('./build.mjs');
build();
const folder = path.join(root, 'bench');
const wanted = process.argv.slice(2);
const files = fs.readdirSync(folder).filter((name) => name.endsWith('.mjs'));
for (const file of files.filter(
  (name) => wanted.length === 0 || wanted.some((word) => name.includes(word)),
)) {
  const { run } = await import(pathToFileURL(path.join(folder, file)).href);
  for (const figure of await run()) console.log(JSON.stringify(figure));
}
process.exit(0);
