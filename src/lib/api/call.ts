import { API_OPERATIONS, fillPath, type OperationId } from '#shared/contracts/api-paths';
import type { ApiTypes, FileBytes } from '#shared/contracts/api-types';
import { send } from './transport';

type Known = OperationId & keyof ApiTypes;

/** What a call of one operation takes: the path's parameters, the query, the body, where it has them. */
export type CallInput<Id extends Known> = (keyof ApiTypes[Id]['params'] extends never
  ? { params?: undefined }
  : { params: ApiTypes[Id]['params'] }) &
  (ApiTypes[Id]['query'] extends undefined
    ? { query?: undefined }
    : { query?: Partial<ApiTypes[Id]['query']> }) &
  (ApiTypes[Id]['body'] extends undefined
    ? { body?: undefined }
    : { body: ApiTypes[Id]['body'] | FormData }) & {
    signal?: AbortSignal;
    /** Makes a write safe to send twice; take one key for one intention. */
    idempotencyKey?: string;
  };

interface LooseInput {
  params?: Readonly<Record<string, string | number>>;
  query?: object;
  body?: unknown;
  signal?: AbortSignal;
  idempotencyKey?: string;
}

/** The answer as the client sees it: files are opened at `addressOf`, all else is JSON. */
export type CallAnswer<Id extends Known> = ApiTypes[Id]['response'] extends FileBytes
  ? never
  : ApiTypes[Id]['response'];

function queryText(query: object | undefined): string {
  const entries = Object.entries(query ?? {}).filter(([, v]) => v !== undefined && v !== '');
  if (entries.length === 0) return '';
  return `?${new URLSearchParams(entries.map(([k, v]) => [k, String(v)]))}`;
}

/** The address of an operation, for links that the browser follows by itself (downloads, letters). */
export function addressOf(id: Known, input: Pick<LooseInput, 'params' | 'query'> = {}): string {
  return fillPath(API_OPERATIONS[id].path, input.params ?? {}) + queryText(input.query);
}

function sendTo(id: Known, input: LooseInput): Promise<Response> {
  return send({
    method: API_OPERATIONS[id].method,
    url: addressOf(id, input),
    body: input.body,
    headers: input.idempotencyKey ? { 'Idempotency-Key': input.idempotencyKey } : {},
    signal: input.signal,
  });
}

/** Calls an operation of the API by its name and gives its JSON answer. Throws ApiProblem or ConnectionLost. */
export async function call<Id extends Known>(id: Id, input: CallInput<Id>): Promise<CallAnswer<Id>> {
  const response = await sendTo(id, input as LooseInput);
  if (response.status === 204) return undefined as unknown as CallAnswer<Id>;
  return (await response.json()) as CallAnswer<Id>;
}

/** A form with one file and its text fields, as the upload operations take it. */
export function fileForm(file: File, fields: Readonly<Record<string, string>> = {}): FormData {
  const form = new FormData();
  Object.entries(fields).forEach(([name, value]) => form.set(name, value));
  form.set('file', file);
  return form;
}
