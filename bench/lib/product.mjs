// A running product with one workshop of its own, for the figures that need a server.
import { stopChildren } from '../../scripts/processes.mjs';
import { startProduct, untilReady } from '../../scripts/services.mjs';

/** Starts the product on a test database; `call` speaks to its API as an owner. */
export async function openProduct({ demo = false } = {}) {
  const product = await startProduct({ cluster: 'test', port: 0, demo, env: { LOG_LEVEL: 'warn' } });
  if (!(await untilReady(product.api, product.address))) throw new Error('The API did not start.');
  let token;
  const call = async (method, path, body) => {
    const response = await fetch(`${product.address}/api${path}`, {
      method,
      headers: { 'content-type': 'application/json', ...(token ? { authorization: `Bearer ${token}` } : {}) },
      body: body === undefined ? undefined : JSON.stringify(body),
    });
    const answer = response.status === 204 ? undefined : await response.json();
    if (!response.ok) throw new Error(`${method} ${path}: ${response.status} ${JSON.stringify(answer)}`);
    return answer;
  };
  const email = `bench-${Date.now()}@workshop.example`;
  const password = 'a long enough password';
  const workshopName = 'Bench workshop';
  const session = await call('POST', '/auth/sign-up', {
    name: 'Bench Keeper',
    email,
    password,
    workshopName,
  });
  token = session.accessToken;
  const close = async () => {
    await stopChildren();
    await product.database.stop();
  };
  return { ...product, call, email, password, token, workshopId: session.workshops[0].id, close };
}
