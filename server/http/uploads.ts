import type { RequestHandler } from 'express';
import multer, { MulterError } from 'multer';
import { fieldError } from './problem';

const MEGABYTE = 1024 * 1024;

/** One file in memory under the field given, of at most `megabytes`; a larger one answers 413, a torn form 400. */
export function oneFile(field: string, megabytes: number): RequestHandler {
  const read = multer({
    storage: multer.memoryStorage(),
    limits: { fileSize: megabytes * MEGABYTE, files: 1, fields: 4, parts: 6 },
    defParamCharset: 'utf8',
  }).single(field);
  return (req, res, next) => {
    read(req, res, (error: unknown) => {
      if (error === undefined || error === null) next();
      else if (error instanceof MulterError && error.code.startsWith('LIMIT_')) next(error);
      else next(fieldError(field, 'The upload could not be read to its end. Send the file again.'));
    });
  };
}
