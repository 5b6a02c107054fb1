import type { Server } from 'node:http';

const PATIENCE_MS = 10_000;

/**
 * On SIGINT or SIGTERM takes no new requests, lets those under way finish, then calls `finish`. What has not finished
 * after ten seconds, or at a second signal, is cut off.
 */
export function stopGently(server: Server, finish: () => void): void {
  let stopping = false;
  const stop = () => {
    if (stopping) {
      server.closeAllConnections();
      return;
    }
    stopping = true;
    const impatient = setTimeout(() => server.closeAllConnections(), PATIENCE_MS);
    server.close(() => {
      clearTimeout(impatient);
      finish();
      process.exitCode = 0;
      process.off('SIGINT', stop).off('SIGTERM', stop);
    });
    server.closeIdleConnections();
  };
  process.on('SIGINT', stop).on('SIGTERM', stop);
}
