import type { Request, Response } from 'express';
import { API_OPERATIONS } from '../../shared/contracts/api-paths';
import type { HttpMethod, OperationId } from '../../shared/contracts/api-paths';
import type { ApiTypes } from '../../shared/contracts/api-types';
import type { SchemaPath } from '../../shared/contracts/validators-by-name';
import type { Action, AppAbility, Subject } from '../../shared/policies/subjects';
import type { UserActor } from '../database/actor';
import type { Transaction } from '../database/transaction';
import type { SessionDoor } from '../integrations/session-door';
import type { Upload } from '../middleware/upload';
import type { Context } from '../integrations/context';

/** Who may come in at all; what exactly they may do it to is asked of the loaded object by the service. */
export type Access = 'anyone' | 'half-signed-in' | 'signed-in' | { can: Action; on: Subject };

type SchemaName<Folder extends string> = SchemaPath extends infer P
  ? P extends `${Folder}/${infer Name}`
    ? Name
    : never
  : never;

/** The schema of each status that a route answers with when all went well; the first is the usual one. */
export type Answers = Readonly<
  Partial<Record<200 | 201 | 202, SchemaName<'responses'> | 'bytes' | 'openapi'>>
>;

export interface UploadedFile {
  name: string;
  mediaType: string;
  bytes: Buffer;
}

/** What a handler gets: everything checked, and the transaction that its whole work belongs to. */
export interface OpenCall<Id extends OperationId> {
  tx: Transaction;
  params: { [K in keyof ApiTypes[Id]['params']]: string };
  query: NonNullable<ApiTypes[Id]['query']>;
  body: NonNullable<ApiTypes[Id]['body']>;
  context: Context;
  session: SessionDoor;
  /** Address of the client, for limits. */
  address: string;
}

export interface Call<Id extends OperationId> extends OpenCall<Id> {
  actor: UserActor;
  ability: AppAbility;
  /** The uploaded file of a route with `upload`. */
  file: UploadedFile;
  /** Its text fields. */
  fields: Readonly<Record<string, string>>;
}

/** A status other than the usual one, headers, or bytes instead of JSON. */
export class Answer<Body> {
  constructor(
    readonly body: Body,
    readonly status?: 200 | 201 | 202,
    readonly headers: Readonly<Record<string, string>> = {},
  ) {}
}

export interface FileAnswer {
  bytes: Uint8Array;
  mediaType: string;
  fileName: string;
}

type BodyOf<Id extends OperationId> = ApiTypes[Id]['response'] extends { readonly bytes: Uint8Array }
  ? FileAnswer
  : ApiTypes[Id]['response'];
type Handled<Id extends OperationId> = Promise<BodyOf<Id> | Answer<BodyOf<Id>>>;

interface Described {
  summary: string;
  answers: Answers;
}

interface Written extends Described {
  /** Takes an Idempotency-Key: the same answer again for a repeat. */
  idempotent?: boolean;
  /** Needs `version` in the body or `If-Match`. */
  versioned?: boolean;
}

export interface RouteSpec<Id extends OperationId> extends Written {
  access: Exclude<Access, 'anyone' | 'half-signed-in'>;
  upload?: Upload;
  handler: (call: Call<Id>) => Handled<Id>;
}

export interface OpenRouteSpec<Id extends OperationId> extends Described {
  access: 'anyone' | 'half-signed-in';
  handler: (call: OpenCall<Id>) => Handled<Id>;
}

export interface BareRouteSpec extends Described {
  handler: (context: Context, request: Request, response: Response) => Promise<unknown>;
}

/** One row of the route table. */
export interface Route extends Written {
  operationId: OperationId;
  method: HttpMethod;
  path: string;
  access: Access;
  upload?: Upload;
  /** `bare` routes open no transaction: health, the description of the API. */
  kind: 'bare' | 'transaction';
  handler: (call: never) => Promise<unknown>;
  bareHandler?: BareRouteSpec['handler'];
}

/** A route for people who are signed in. Method and path come from the contract by the operation's name. */
export function route<Id extends OperationId>(operationId: Id, spec: RouteSpec<Id>): Route {
  return { operationId, ...API_OPERATIONS[operationId], ...spec, kind: 'transaction' };
}

/** A route that answers before anybody is signed in. Its transaction has the product's own sight: mind what leaves. */
export function openRoute<Id extends OperationId>(operationId: Id, spec: OpenRouteSpec<Id>): Route {
  return { operationId, ...API_OPERATIONS[operationId], ...spec, kind: 'transaction' };
}

/** A route that must answer without the database. */
export function bareRoute(operationId: OperationId, { handler, ...spec }: BareRouteSpec): Route {
  return {
    operationId,
    ...API_OPERATIONS[operationId],
    ...spec,
    access: 'anyone',
    kind: 'bare',
    handler: () => Promise.reject(new Error('a bare route has no call')),
    bareHandler: handler,
  };
}
