import type { RequestHandler } from 'express';
import multer from 'multer';

export interface Upload {
  maxBytes: number;
  /** Text fields that may come with the field `file`. */
  fields: readonly string[];
}

/** Takes one file into memory, within limits that are checked while it comes in. */
export function takeUpload({ maxBytes, fields }: Upload): RequestHandler {
  const take = multer({
    defParamCharset: 'utf8',
    storage: multer.memoryStorage(),
    limits: {
      fileSize: maxBytes,
      files: 1,
      fields: fields.length,
      fieldNameSize: 60,
      fieldSize: 2000,
      parts: fields.length + 1,
      headerPairs: 20,
    },
  });
  return take.single('file') as RequestHandler;
}
