import { connect } from 'node:net';
import { setTimeout as sleep } from 'node:timers/promises';
import { Stop } from './say.mjs';

const isListening = (port) =>
  new Promise((resolve) => {
    const socket = connect({ port, host: '127.0.0.1' });
    socket.once('connect', () => {
      socket.destroy();
      resolve(true);
    });
    socket.once('error', () => resolve(false));
  });

export const isHealthy = async (origin) => {
  try {
    const response = await fetch(`${origin}/api/health`, { signal: AbortSignal.timeout(3000) });
    return response.ok;
  } catch {
    return false;
  }
};

async function until(check, what, withinMs) {
  for (let waited = 0; waited < withinMs; waited += 100) {
    if (await check()) return;
    await sleep(100);
  }
  throw new Stop(`${what} did not answer within ${withinMs / 1000} s. The logs are in data/logs.`);
}

export const untilListening = (port, what) => until(() => isListening(port), what, 15_000);
export const untilHealthy = (origin) => until(() => isHealthy(origin), 'The web process', 60_000);
