import { join } from 'node:path';

/** The project's folder. */
export const ROOT = join(__dirname, '../..');
