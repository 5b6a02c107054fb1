// Bundles the server and, with --if-stale, builds whichever half is older than its sources.
import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { build } from 'esbuild';

const root = join(import.meta.dirname, '..');
const onlyIfStale = process.argv.includes('--if-stale');

/** The newest change below the given files and folders, in ms since 1970. */
function newestIn(...paths) {
  let newest = 0;
  for (const path of paths.map((p) => join(root, p))) {
    const stat = statSync(path);
    if (!stat.isDirectory()) newest = Math.max(newest, stat.mtimeMs);
    else
      for (const entry of readdirSync(path, { recursive: true, withFileTypes: true }))
        if (entry.isFile()) newest = Math.max(newest, statSync(join(entry.parentPath, entry.name)).mtimeMs);
  }
  return newest;
}

function isStale(output, ...sources) {
  const file = join(root, output);
  return !existsSync(file) || statSync(file).mtimeMs < newestIn(...sources);
}

if (onlyIfStale && isStale('dist/web/index.html', 'src', 'angular.json', 'package-lock.json')) {
  console.log('Building the pages (about half a minute, once) …');
  const { status } = spawnSync(process.execPath, [join(root, 'node_modules/@angular/cli/bin/ng.js'), 'build'], {
    cwd: root,
    stdio: 'inherit',
  });
  if (status !== 0) process.exit(status ?? 1);
}

if (!onlyIfStale || isStale('dist/server/main.js', 'server', 'seeds', 'src/domain', 'src/contracts'))
  await build({
    absWorkingDir: root,
    entryPoints: ['server/main.ts'],
    outfile: 'dist/server/main.js',
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'esm',
    packages: 'external', // node_modules stay outside the bundle
    sourcemap: true,
    tsconfig: 'server/tsconfig.json',
    logLevel: 'warning',
  });
