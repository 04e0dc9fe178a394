import type { Response } from 'express';
import { faultsAgainst } from '../../shared/contracts/validators-by-name';
import { Answer } from '../routes/route';
import type { FileAnswer, Route } from '../routes/route';
import type { Context } from '../integrations/context';

/** A file name for a header: plain for old readers, whole for all others (RFC 6266, RFC 8187). */
function disposition(fileName: string): string {
  const plain = fileName.replace(/[^\x20-\x7e]|["\\%;]/g, '_');
  const whole = encodeURIComponent(fileName).replace(
    /['()*]/g,
    (c) => `%${c.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `attachment; filename="${plain}"; filename*=UTF-8''${whole}`;
}

/** Somebody's file is never a page of ours: it is saved, not shown, and could run nothing if it were. */
function sendFile(response: Response, { bytes, mediaType, fileName }: FileAnswer): void {
  response.setHeader('Content-Disposition', disposition(fileName));
  response.setHeader('Content-Security-Policy', "default-src 'none'; frame-ancestors 'none'; sandbox");
  response.setHeader('Content-Type', mediaType);
  response.end(Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength));
}

const versionOf = (body: unknown): number | undefined => {
  const version =
    typeof body === 'object' && body !== null ? (body as { version?: unknown }).version : undefined;
  return typeof version === 'number' ? version : undefined;
};

/** Sends what a handler answered, in the form that the route table promises for its status. */
export function sendAnswer(route: Route, context: Context, response: Response, result: unknown): void {
  const usual = Number(Object.keys(route.answers)[0] ?? 200);
  const answer = result instanceof Answer ? (result as Answer<unknown>) : new Answer(result);
  const status = answer.status ?? usual;
  const schema = route.answers[status as 200];
  if (!schema) throw new Error(`${route.operationId} does not answer with ${status}`);
  response.status(status).set(answer.headers);
  if (schema === 'bytes') return sendFile(response, answer.body as FileAnswer);
  const body: unknown = answer.body;
  if (context.checkAnswers && schema !== 'openapi') {
    const faults = faultsAgainst(`responses/${schema}`, JSON.parse(JSON.stringify(body)));
    if (faults.length > 0)
      throw new Error(`${route.operationId} answers against its schema: ${JSON.stringify(faults)}`);
  }
  const version = versionOf(body);
  if (version !== undefined) response.setHeader('ETag', `"${version}"`);
  response.json(body);
}
