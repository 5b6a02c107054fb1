// The import rules as a lint rule: refuses a direct import outside what its room may import.
import { existsSync } from 'node:fs';
import { dirname, relative, resolve, sep } from 'node:path';
import rules from './import-rules.cjs';

const fromRoot = (root, file) => relative(root, file).split(sep).join('/');

/** A relative import's file, with its ending. */
function target(file, source) {
  const path = resolve(dirname(file), source);
  return [path, `${path}.ts`, resolve(path, 'index.ts')].find((p) => /\.\w+$/.test(p) && existsSync(p)) ?? `${path}.ts`;
}

export default {
  meta: {
    type: 'problem',
    schema: [],
    messages: { denied: '{{room}} may not import {{what}} (tests/architecture/import-rules.cjs).' },
  },
  create(context) {
    const file = fromRoot(context.cwd, context.filename);
    if (new RegExp(rules.SPEC).test(file)) return {};
    const room = rules.ROOMS.find(({ from }) => new RegExp(from).test(file));
    if (room === undefined) return {};
    const part = new RegExp(room.from).exec(file)?.[1] ?? '';

    const check = (node) => {
      const source = node.source?.value;
      if (typeof source !== 'string') return;
      const local = source.startsWith('.');
      const what = local ? fromRoot(context.cwd, target(context.filename, source)) : source;
      const allowed = local
        ? room.to.some((pattern) => new RegExp(pattern.replace('$1', part)).test(what))
        : room.packages === undefined || room.packages.some((name) => new RegExp(`^${name}(/|$)`).test(what));
      if (!allowed) context.report({ node, messageId: 'denied', data: { room: room.name, what } });
    };
    return {
      ImportDeclaration: check,
      ExportNamedDeclaration: check,
      ExportAllDeclaration: check,
      ImportExpression: check,
    };
  },
};
