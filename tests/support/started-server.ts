import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ROOT } from './root';

export interface StartedServer {
  readonly address: string;
  /** What it printed so far. */
  output(): string;
  /** Asks it to stop and answers its exit code. */
  stop(): Promise<number | null>;
}

const running = new Set<ChildProcess>();

/** Ends every server that a failed test left behind; for `afterAll`. */
export function stopServers(): void {
  for (const child of running) child.kill('SIGKILL');
}

/** Starts the built server as `npm start` does, on a free port, over the data folder given. */
export async function startServer(
  dataFolder: string,
  args: readonly string[] = [],
  env: NodeJS.ProcessEnv = {},
): Promise<StartedServer> {
  const child = spawn(process.execPath, [join(ROOT, 'dist/server/main.js'), ...args], {
    cwd: ROOT,
    env: { ...process.env, PORT: '0', THENWORTH_DATA: dataFolder, NODE_ENV: 'development', ...env },
  });
  running.add(child);
  let output = '';
  const exited = new Promise<number | null>((resolve) => child.once('exit', (code) => resolve(code)));
  void exited.then(() => running.delete(child));
  const address = await new Promise<string>((resolve, reject) => {
    const read = (chunk: Buffer) => {
      output += chunk.toString();
      const found = /http:\/\/127\.0\.0\.1:\d+/.exec(output);
      if (found) resolve(found[0]);
    };
    child.stdout.on('data', read);
    child.stderr.on('data', read);
    void exited.then((code) => reject(new Error(`the server ended with ${code}:\n${output}`)));
  });
  return {
    address,
    output: () => output,
    stop: () => {
      child.kill('SIGTERM');
      return exited;
    },
  };
}

/** A data folder of its own, and its removal. */
export function temporaryFolder(): { path: string; remove: () => void } {
  const path = mkdtempSync(join(tmpdir(), 'thenworth-e2e-'));
  return { path, remove: () => rmSync(path, { recursive: true, force: true }) };
}
