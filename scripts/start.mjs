// npm start: everything a fresh machine needs, then the product on one port.
import { installDebianPackages, installPackages } from './set-up.mjs';

installPackages();
installDebianPackages(['postgresql']);
const { build } = await import('./build.mjs');
const { stopChildren, watchParents } = await import('./processes.mjs');
const { startProduct, untilReady } = await import('./services.mjs');

build();
const product = await startProduct({
  cluster: 'main',
  port: Number(process.env.PORT ?? 3000),
  demo: process.env.DEMO !== '0',
});

let stopping = false;
async function stop(code) {
  if (stopping) return;
  stopping = true;
  await stopChildren();
  await product.database.stop();
  process.exit(code);
}
process.on('SIGINT', () => void stop(0));
process.on('SIGTERM', () => void stop(0));
process.on('SIGHUP', () => void stop(0));
watchParents(() => void stop(0));
product.api.once('exit', (code) => void stop(code ?? 1));

if (await untilReady(product.api, product.address)) {
  console.log(`
Settlewright runs at ${process.env.PUBLIC_URL ?? product.address}
${product.mail.page ? `Mail it sends is shown at ${product.mail.page}\n` : ''}${
    process.env.DEMO === '0'
      ? ''
      : `Demo workshop, password "larch-junction" for each:
  owner      nell@ropewalk.example
  designer   joss@ropewalk.example
  carpenter  petra@ropewalk.example
  reviewer   hugo@ropewalk.example
`
  }Ctrl-C stops it.`);
}
