// A local stand-in for an object store: PUT, GET, HEAD and DELETE of an object, kept as files in a folder.
import { createHash } from 'node:crypto';
import fs from 'node:fs/promises';
import http from 'node:http';
import path from 'node:path';

const port = Number(process.env.FAKE_OBJECTS_PORT ?? 0);
const folder = process.env.FAKE_OBJECTS_FOLDER ?? '.data/objects';

const fileOf = (pathname) =>
  path.join(folder, createHash('sha256').update(decodeURIComponent(pathname)).digest('hex'));

const fault = (response, status, code) =>
  response
    .writeHead(status, { 'content-type': 'application/xml' })
    .end(`<?xml version="1.0"?><Error><Code>${code}</Code><Message>${code}</Message></Error>`);

async function put(request, response, file) {
  const chunks = [];
  for await (const chunk of request) chunks.push(chunk);
  const body = Buffer.concat(chunks);
  if (body.length !== Number(request.headers['content-length']))
    return fault(response, 400, 'IncompleteBody');
  // Whole or not at all: the last step gives it its name.
  const half = `${file}.${process.pid}.${Math.random().toString(36).slice(2)}`;
  await fs.writeFile(half, body);
  await fs.writeFile(`${file}.type`, request.headers['content-type'] ?? 'application/octet-stream');
  await fs.rename(half, file);
  response.writeHead(200, { etag: `"${createHash('md5').update(body).digest('hex')}"` }).end();
}

async function get(request, response, file) {
  const body = await fs.readFile(file).catch(() => null);
  if (body === null) return fault(response, 404, 'NoSuchKey');
  const type = await fs.readFile(`${file}.type`, 'utf8').catch(() => 'application/octet-stream');
  response.writeHead(200, { 'content-type': type, 'content-length': body.length });
  response.end(request.method === 'HEAD' ? undefined : body);
}

async function remove(response, file) {
  await Promise.all([fs.rm(file, { force: true }), fs.rm(`${file}.type`, { force: true })]);
  response.writeHead(204).end();
}

const server = http.createServer((request, response) => {
  const { pathname } = new URL(request.url ?? '/', 'http://127.0.0.1');
  const signed = request.headers.authorization?.startsWith('AWS4-HMAC-SHA256 ');
  if (!signed) return fault(response, 403, 'AccessDenied');
  const file = fileOf(pathname);
  const work = {
    PUT: () => put(request, response, file),
    GET: () => get(request, response, file),
    HEAD: () => get(request, response, file),
    DELETE: () => remove(response, file),
  }[request.method];
  if (!work) return fault(response, 405, 'MethodNotAllowed');
  work().catch(() => fault(response, 500, 'InternalError'));
});

await fs.mkdir(folder, { recursive: true });
server.listen(port, '127.0.0.1', () => process.send?.({ port: server.address().port }));
process.on('SIGTERM', () => process.exit(0));
process.on('SIGINT', () => process.exit(0));
process.on('disconnect', () => process.exit(0));
