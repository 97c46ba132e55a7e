import net from 'node:net';

const listen = (port) =>
  new Promise((resolve) => {
    const server = net.createServer();
    server.once('error', () => resolve(undefined));
    server.listen(port, '127.0.0.1', () => {
      const taken = server.address().port;
      server.close(() => resolve(taken));
    });
  });

/** The wanted port of 127.0.0.1 when it is free, else any free one. */
export async function freePort(wanted = 0) {
  return (await listen(wanted)) ?? (await listen(0));
}
