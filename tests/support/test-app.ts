import { resolve } from 'node:path';
import type { Express } from 'express';
import supertest from 'supertest';
import { makeApp } from '#server/app/make-app';
import { makeConfig } from '#server/config/config';
import { makePlainPool } from '#server/database/plain-pool';
import { roleUrl } from '#server/database/roles';
import type { Role } from '#server/entities/people.entities';
import type { Context } from '#server/integrations/context';
import { makeLogger } from '#server/logging/logger';
import { hashPassword } from '#server/services/session/passwords';
import type { Organisation } from '#server/entities/people.entities';
import { aMembership, anOrganisation, aUser } from './people';
import type { UserActor } from './people';
import { makeTestDatabase } from './test-database';
import type { TestDatabase } from './test-database';

export const PASSWORD = 'three brown herons wade';
let passwordHash: Promise<string> | undefined;

/** Somebody signed in over HTTP; `call` sends the token along. */
export interface Client {
  actor: UserActor;
  email: string;
  csrfToken: string;
  agent: ReturnType<typeof supertest.agent>;
  get(path: string): supertest.Test;
  post(path: string, body?: object): supertest.Test;
  put(path: string, body?: object): supertest.Test;
  patch(path: string, body?: object): supertest.Test;
  delete(path: string): supertest.Test;
}

export interface TestApp {
  db: TestDatabase;
  app: Express;
  context: Context;
  /** Nobody signed in. */
  visitor(): ReturnType<typeof supertest.agent>;
  owner: Organisation;
  /** A new person in the role; of the given organisation, else of the owner or of a new applicant. */
  signInAs(role: Role, org?: Organisation): Promise<Client>;
  /** An account with the test password. */
  account(role: Role, org: Organisation): Promise<{ actor: UserActor; email: string }>;
  close(): Promise<void>;
}

interface AppOptions {
  totpRequired?: boolean;
  demo?: boolean;
  setUpToken?: string | null;
}

export async function signIn(app: Express, email: string, actor: UserActor): Promise<Client> {
  const agent = supertest.agent(app);
  const answer = await agent.post('/api/session').send({ email, password: PASSWORD });
  if (answer.status !== 200) throw new Error(`sign-in of ${email}: ${answer.status} ${answer.text}`);
  const { csrfToken } = answer.body as { csrfToken: string };
  const send = (method: 'post' | 'put' | 'patch') => (path: string, body?: object) =>
    agent[method](path)
      .set('X-CSRF-Token', csrfToken)
      .send(body ?? {});
  return {
    actor,
    email,
    csrfToken,
    agent,
    get: (path) => agent.get(path),
    post: send('post'),
    put: send('put'),
    patch: send('patch'),
    delete: (path) => agent.delete(path).set('X-CSRF-Token', csrfToken),
  };
}

/** The product's own application on a database of one's own; answers are held against their schemas. */
export async function makeTestApp({
  totpRequired = false,
  demo = true,
  setUpToken = null,
}: AppOptions = {}): Promise<TestApp> {
  const db = await makeTestDatabase();
  const pool = makePlainPool(roleUrl(db.ownerUrl, db.secret, 'web'), 3);
  const config = {
    ...makeConfig({
      databaseUrl: db.ownerUrl,
      sessionSecret: db.secret,
      demo: demo ? 'on' : 'off',
      logLevel: 'silent',
    }),
    totpRequired,
  };
  const context: Context = {
    config,
    surroundings: db.surroundings,
    pool,
    log: makeLogger('silent'),
    root: resolve(import.meta.dirname, '../..'),
    checkAnswers: true,
    setUpToken,
  };
  const app = makeApp(context);
  const owner = await db.asSystem((tx) => anOrganisation(tx, { name: 'Grid owner', kind: 'owner' }));
  const account: TestApp['account'] = async (role, org) => {
    passwordHash ??= hashPassword(PASSWORD);
    const hash = await passwordHash;
    return db.asSystem(async (tx) => {
      const user = await aUser(tx, { passwordHash: hash });
      await aMembership(tx, user, org, role);
      const actor: UserActor = {
        kind: 'user',
        userId: user.id,
        name: user.displayName,
        orgId: org.id,
        role,
        barredOrgIds: [],
      };
      return { actor, email: user.email };
    });
  };
  return {
    db,
    app,
    context,
    owner,
    account,
    visitor: () => supertest.agent(app),
    signInAs: async (role, org) => {
      const home = org ?? (role === 'applicant' ? await db.asSystem((tx) => anOrganisation(tx)) : owner);
      const { actor, email } = await account(role, home);
      return signIn(app, email, actor);
    },
    close: async () => {
      await pool.end();
      await db.close();
    },
  };
}
