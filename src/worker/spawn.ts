/** Starts the worker of logs from a file of the app: the page allows none from elsewhere. */
import type { Port } from './client.ts';

export const spawn = (): Port =>
  new Worker(new URL('./log.worker.ts', import.meta.url), { type: 'module', name: 'logs' }) as unknown as Port;
