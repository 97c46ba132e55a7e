// What a browser fetches: JavaScript of the first page, and of the room beyond it, both packed with gzip.
import fs from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { root } from '../scripts/root.mjs';

const dist = path.join(root, 'apps/web/dist');

function chunksFrom(manifest, key, seen = new Set()) {
  if (seen.has(key)) return seen;
  seen.add(key);
  for (const next of manifest[key].imports ?? []) chunksFrom(manifest, next, seen);
  return seen;
}

function packedKilobytes(manifest, keys) {
  const bytes = [...keys]
    .map((key) => manifest[key].file)
    .filter((file) => file.endsWith('.js'))
    .reduce((sum, file) => sum + gzipSync(fs.readFileSync(path.join(dist, file)), { level: 9 }).length, 0);
  return Math.round(bytes / 100) / 10;
}

export async function run() {
  const manifest = JSON.parse(fs.readFileSync(path.join(dist, '.vite/manifest.json'), 'utf8'));
  const entry = Object.keys(manifest).find((key) => manifest[key].isEntry);
  const first = chunksFrom(manifest, entry);
  for (const key of ['src/routes/entrance.tsx', 'src/routes/sign-in.tsx']) {
    if (manifest[key]) chunksFrom(manifest, key, first);
  }
  const room = new Set([...chunksFrom(manifest, 'src/routes/room.tsx')].filter((key) => !first.has(key)));
  return [
    {
      name: 'first-page-gzip',
      value: packedKilobytes(manifest, first),
      unit: 'kB',
      aim: 140,
      reference: null,
    },
    { name: 'room-gzip', value: packedKilobytes(manifest, room), unit: 'kB', aim: 320, reference: null },
  ];
}
