/** Files in multipart bodies: exactly one, under the name its route declares, kept in memory. */
import type { RequestHandler } from 'express';
import multer, { MulterError } from 'multer';
import { ApiError, badInput } from './errors';

export interface UploadDeclaration {
  /** The name of the file's part in the body. */
  readonly field: string;
  /** Greatest size in bytes. */
  readonly most: number;
}

/** Reads the file into `request.file`. Passes on `too-large` and `bad-input` for what it cannot take. */
export function uploadBody({ field, most }: UploadDeclaration): RequestHandler {
  const read = multer({
    storage: multer.memoryStorage(),
    limits: { fileSize: most, files: 1, fields: 0, parts: 1, fieldNameSize: 100 },
  }).single(field);
  return (request, response, next) => {
    void read(request, response, (error: unknown) => {
      next(
        error === undefined || error === null
          ? noFile(request.file, field)
          : refusalOf(error, { field, most }),
      );
    });
  };
}

function noFile(file: Express.Multer.File | undefined, field: string): ApiError | undefined {
  return file
    ? undefined
    : badInput([{ field, message: 'must be one file (multipart/form-data)' }]);
}

function refusalOf(error: unknown, { field, most }: UploadDeclaration): unknown {
  if (!(error instanceof MulterError)) {
    // what the reader of multipart bodies throws has neither a code nor a class of its own
    return badInput([{ field: '', message: 'must be a whole body of multipart/form-data' }]);
  }
  if (error.code === 'LIMIT_FILE_SIZE') {
    const megabytes = Math.floor(most / 1024 / 1024);
    return new ApiError(
      'too-large',
      `The ${field} must be at most ${megabytes} MB; this one is larger. Save it smaller.`,
      [{ field, message: `must be at most ${megabytes} MB` }],
    );
  }
  return badInput([{ field, message: 'must be the only part of the body' }]);
}
