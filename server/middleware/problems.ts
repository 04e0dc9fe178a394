import type { ErrorRequestHandler, RequestHandler } from 'express';
import multer from 'multer';
import { PROBLEMS, problemType } from '../../shared/contracts/errors';
import { postgresCode } from '../errors/postgres-code';
import { Problem } from '../errors/problem';
import type { Logger } from '../logging/logger';

// What the database, or the way to it, says when it cannot work just now.
const UNAVAILABLE_CODES =
  /^(08...|53...|57P0.|57014|55P03|25P03|ECONNREFUSED|ECONNRESET|EPIPE|ETIMEDOUT|ENOTFOUND)$/;
const UNAVAILABLE_WORDS = /timeout exceeded when trying to connect|Connection terminated|Query read timeout/;

const unavailable = () =>
  new Problem('unavailable', {
    detail: 'The database cannot be reached. Try again in a moment.',
    retryAfterSeconds: 2,
  });

function fromUpload(error: multer.MulterError): Problem {
  if (error.code === 'LIMIT_FILE_SIZE') return new Problem('too-large', { detail: 'The file is too large.' });
  return new Problem('invalid-request', { detail: `The upload cannot be read: ${error.message}.` });
}

/** What the parsers of Express say of a body, by the kind that they give it. */
function fromParser(type: string): Problem | undefined {
  if (type === 'entity.too.large') return new Problem('too-large');
  if (type === 'encoding.unsupported' || type === 'charset.unsupported')
    return new Problem('unsupported-media-type');
  if (type === 'entity.parse.failed')
    return new Problem('invalid-request', { detail: 'The body is not valid JSON.' });
  if (/^(request\.|entity\.|stream\.)/.test(type)) return new Problem('invalid-request');
  return undefined;
}

/** Any error as a problem; what nobody foresaw becomes a plain `internal`. */
export function problemOf(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (error instanceof multer.MulterError) return fromUpload(error);
  const { type, status, message } = (error ?? {}) as { type?: unknown; status?: unknown; message?: unknown };
  const parsed = typeof type === 'string' ? fromParser(type) : undefined;
  if (parsed) return parsed;
  const code = postgresCode(error) ?? '';
  if (UNAVAILABLE_CODES.test(code) || (typeof message === 'string' && UNAVAILABLE_WORDS.test(message))) {
    return unavailable();
  }
  if (error instanceof AggregateError && error.errors.length > 0) return problemOf(error.errors[0]);
  if (code === '23505')
    return new Problem('conflict', { detail: 'Something with this name or number exists already.' });
  if (error instanceof URIError || status === 400) return new Problem('invalid-request');
  return new Problem('internal');
}

export const noSuchAddress: RequestHandler = () => {
  throw new Problem('not-found');
};

/** The one place where errors become answers. */
export function problemAnswers(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    if (response.headersSent) return next(error);
    const problem = problemOf(error);
    const { status, title } = PROBLEMS[problem.kind];
    const { detail, errors, extra, retryAfterSeconds } = problem.details;
    if (status >= 500) log.error({ err: error, requestId: request.id, path: request.path }, title);
    if (retryAfterSeconds !== undefined) response.setHeader('Retry-After', String(retryAfterSeconds));
    response
      .status(status)
      .type('application/problem+json')
      .send(
        JSON.stringify({
          ...extra,
          type: problemType(problem.kind),
          title,
          status,
          detail,
          instance: request.originalUrl.split('?')[0],
          requestId: typeof request.id === 'string' ? request.id : undefined,
          errors,
        }),
      );
  };
}
