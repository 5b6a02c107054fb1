import { resolve } from 'node:path';

export interface Config {
  readonly port: number;
  readonly dataFolder: string;
  readonly demo: boolean;
  /** Cookies only over HTTPS, behind a proxy that ends it. */
  readonly https: boolean;
}

/** Reads the environment and the command line; throws naming the variable, its value and what would do. */
export function readConfig(env: NodeJS.ProcessEnv, args: readonly string[]): Config {
  const port = env['PORT'] ?? '3000';
  if (!/^\d{1,5}$/.test(port) || Number(port) > 65535)
    throw new Error(`PORT is «${port}»: use a number from 0 to 65535, such as 3000.`);
  return {
    port: Number(port),
    dataFolder: resolve(env['THENWORTH_DATA'] ?? '.thenworth'),
    demo: !args.includes('--empty') && onOrOff(env, 'THENWORTH_DEMO', true),
    https: onOrOff(env, 'THENWORTH_HTTPS', false),
  };
}

function onOrOff(env: NodeJS.ProcessEnv, name: string, otherwise: boolean): boolean {
  const value = env[name];
  if (value === undefined || value === '') return otherwise;
  if (value === 'on' || value === 'off') return value === 'on';
  throw new Error(`${name} is «${value}»: use on or off.`);
}
