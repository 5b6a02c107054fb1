import type { RequestHandler } from 'express';
import multer from 'multer';

const MEGABYTE = 1024 * 1024;

/** One file in memory under the field given, of at most `megabytes`; a larger one answers 413. */
export function oneFile(field: string, megabytes: number): RequestHandler {
  return multer({
    storage: multer.memoryStorage(),
    limits: { fileSize: megabytes * MEGABYTE, files: 1, fields: 4, parts: 6 },
    defParamCharset: 'utf8',
  }).single(field);
}
