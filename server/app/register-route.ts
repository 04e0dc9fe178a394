import { createHash } from 'node:crypto';
import type { Express, Request, RequestHandler, Response } from 'express';
import { defineAbility } from '../../shared/policies/ability';
import type { AppAbility } from '../../shared/policies/subjects';
import { system } from '../database/actor';
import type { UserActor } from '../database/actor';
import { oncePerKey } from '../database/idempotency';
import type { KeptAnswer } from '../database/idempotency';
import { inTransaction } from '../database/transaction';
import type { ActorSource, Transaction } from '../database/transaction';
import { forbidden, invalidContent, Problem } from '../errors/problem';
import { unkeptText } from '../files/kept-text';
import { refuseCrossSite, requireToken } from '../middleware/cross-site';
import type { SessionDoor, SessionState } from '../integrations/session-door';
import { HttpSessionDoor } from '../middleware/http-session-door';
import { takeUpload } from '../middleware/upload';
import { findActor } from '../services/session/find-actor';
import { checkParameters, expressPath } from './path-parameters';
import { readContent } from './request-content';
import type { Content } from './request-content';
import { Answer } from '../routes/route';
import type { Call, Route, UploadedFile } from '../routes/route';
import type { Context } from '../integrations/context';
import { sendAnswer } from './send-answer';

type AnyCall = Call<never>;

/** Everything that lets somebody in, before a row is read: the site, the session, its stage, its token. */
function admit(route: Route, request: Request, door: SessionDoor, publicUrl: URL): SessionState | null {
  refuseCrossSite(request, publicUrl);
  const { access } = route;
  if (access === 'anyone') return null;
  const { state } = door;
  if (!state) throw new Problem('not-signed-in');
  if (access === 'half-signed-in') return state;
  if (state.stage !== 'full')
    throw new Problem('not-signed-in', { detail: 'Sign-in still needs its second step.' });
  requireToken(request, state.csrfToken);
  return state;
}

function abilityFor(route: Route, actor: UserActor): AppAbility {
  const ability = defineAbility(actor);
  const { access } = route;
  if (typeof access === 'object' && !ability.can(access.can, access.on)) throw forbidden();
  return ability;
}

function uploadedFile(
  route: Route,
  request: Request,
): { file: UploadedFile; fields: Record<string, string> } | null {
  if (!route.upload) return null;
  const { file } = request;
  if (!file) {
    throw invalidContent([
      { pointer: '/file', value: null, expected: 'a file', message: 'The form has no file.' },
    ]);
  }
  const fields = { ...(request.body as Record<string, string>) };
  for (const name of Object.keys(fields)) {
    if (route.upload.fields.includes(name)) continue;
    throw invalidContent([
      { pointer: `/${name}`, value: null, expected: 'nothing', message: `The form has no field "${name}".` },
    ]);
  }
  const faults = unkeptText(fields);
  if (faults.length > 0) throw invalidContent(faults);
  return { file: { name: file.originalname, mediaType: file.mimetype, bytes: file.buffer }, fields };
}

/** The Idempotency-Key of a request that may be repeated. */
function retryKey(route: Route, request: Request): string | null {
  const key = request.get('idempotency-key');
  if (key === undefined || !route.idempotent) return null;
  if (!/^[\x21-\x7e]{1,200}$/.test(key)) {
    throw new Problem('invalid-request', { detail: 'Idempotency-Key takes 1 to 200 visible characters.' });
  }
  return key;
}

function kept(route: Route, result: unknown): KeptAnswer {
  const usual = Number(Object.keys(route.answers)[0] ?? 200);
  return result instanceof Answer
    ? { status: result.status ?? usual, body: result.body as unknown }
    : { status: usual, body: result };
}

function hashOf(file: UploadedFile | undefined): string | null {
  return file ? createHash('sha256').update(file.bytes).digest('hex') : null;
}

async function answerOnce(route: Route, call: AnyCall, key: string): Promise<Answer<unknown>> {
  const request = {
    userId: call.actor.userId,
    key,
    operationId: route.operationId,
    // a consultant who changes the organisation means another request
    content: [call.actor.orgId, call.params, call.query, call.body, call.fields, hashOf(call.file)],
  };
  const work = async () => kept(route, await route.handler(call as never));
  const { status, body, replayed } = await oncePerKey(call.tx, request, work);
  return new Answer(body, status as 200, replayed ? { 'Idempotency-Replayed': 'true' } : {});
}

function makeCall(
  route: Route,
  context: Context,
  request: Request,
  tx: Transaction,
  content: Content,
): AnyCall {
  const uploaded = uploadedFile(route, request);
  const person = tx.actor.kind === 'user' ? tx.actor : null;
  const call = {
    tx,
    ...content,
    ...uploaded,
    params: checkParameters(request.params),
    context,
    session: new HttpSessionDoor(request, () => tx.now),
    address: request.ip ?? '',
    ...(person ? { actor: person, ability: abilityFor(route, person) } : {}),
  };
  return call as unknown as AnyCall;
}

/** From request to answer: admission, content, one transaction, the handler, the answer after the commit. */
function respond(route: Route, context: Context): RequestHandler {
  const { surroundings, config } = context;
  return async (request: Request, response: Response) => {
    if (route.bareHandler) {
      return sendAnswer(route, context, response, await route.bareHandler(context, request, response));
    }
    const door = new HttpSessionDoor(request, () => surroundings.tools.clock.now());
    const state = admit(route, request, door, config.publicUrl);
    const content = readContent(route, request);
    const key = retryKey(route, request);
    const source: ActorSource =
      state?.stage === 'full' ? (manager) => findActor(manager, state) : system(route.operationId);
    const result = await inTransaction(surroundings, source, async (tx) => {
      const call = makeCall(route, context, request, tx, content);
      return key && tx.actor.kind === 'user' ? answerOnce(route, call, key) : route.handler(call as never);
    });
    return sendAnswer(route, context, response, result);
  };
}

/** The upload is taken only from somebody who may come in: strangers are turned away before their bytes are read. */
function guardUpload(route: Route, { surroundings, config }: Context): RequestHandler {
  return (request, _response, next) => {
    admit(
      route,
      request,
      new HttpSessionDoor(request, () => surroundings.tools.clock.now()),
      config.publicUrl,
    );
    next();
  };
}

/** Puts one row of the route table into the application. */
export function registerRoute(app: Express, route: Route, context: Context): void {
  const method = route.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  const before = route.upload ? [guardUpload(route, context), takeUpload(route.upload)] : [];
  app[method](expressPath(route.path), ...before, respond(route, context));
}
