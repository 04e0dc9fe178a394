import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { OutboxMail } from '#server/entities/correspondence.entities';
import { AuditEvent } from '#server/entities/record.entities';
import { anOrganisation } from '../../support/people';
import { makeTestApp, PASSWORD } from '../../support/test-app';
import type { Client, TestApp } from '../../support/test-app';

let test: TestApp;
let administrator: Client;
let applicants: { id: string; name: string };

beforeAll(async () => {
  test = await makeTestApp();
  administrator = await test.signInAs('administrator');
  applicants = await test.db.asSystem((tx) => anOrganisation(tx, { name: 'Sallow Bank Wind' }));
});
afterAll(() => test.close());

/** The token that a mail carries behind the # of its link. */
async function tokenFor(recipient: string): Promise<string> {
  const mails = await test.db.owner.manager.find(OutboxMail, {
    where: { recipient },
    order: { createdAt: 'DESC' },
  });
  const token = /#(\S+)/.exec(mails[0]?.body ?? '')?.[1];
  if (!token) throw new Error(`no link was mailed to ${recipient}`);
  return token;
}

const acts = async () =>
  (await test.db.owner.manager.find(AuditEvent, { order: { seq: 'DESC' }, take: 1 })).map(
    (event) => event.act,
  )[0];

describe('who may administer', () => {
  it.each([
    ['get', '/api/people'],
    ['get', '/api/organisations'],
    ['get', '/api/invitations'],
    ['get', '/api/audit-events'],
    ['get', '/api/rules/versions'],
    ['get', '/api/rules/draft'],
    ['post', '/api/invitations'],
    ['post', '/api/organisations'],
  ] as const)('%s %s: administrators, nobody else', async (method, path) => {
    for (const role of ['applicant', 'reviewer'] as const) {
      const client = await test.signInAs(role);
      const bodies: Record<string, object> = {
        '/api/invitations': {
          email: 'x@example.org',
          name: 'X',
          organisationId: applicants.id,
          role: 'applicant',
        },
        '/api/organisations': { name: 'Mine' },
      };
      const answer = method === 'get' ? await client.get(path) : await client.post(path, bodies[path]);
      expect(answer.body, role).toMatchObject({ status: 403, type: '/problems/forbidden' });
    }
    const visitor = method === 'get' ? test.visitor().get(path) : test.visitor().post(path).send({});
    expect((await visitor).body).toMatchObject({ status: 401, type: '/problems/not-signed-in' });
    if (method === 'get') await administrator.get(path).expect(200);
  });
});

describe('an invitation', () => {
  it('leads by mail to an account with the role that was invited to', async () => {
    const email = 'rowan@example.org';
    const body = { email, name: 'Rowan Vale', organisationId: applicants.id, role: 'applicant' };
    const made = await administrator.post('/api/invitations', body).expect(201);
    expect(made.body).toMatchObject({ status: 'sent', organisation: { name: 'Sallow Bank Wind' } });
    const token = await tokenFor(email);
    const accept = { token, name: 'Rowan Vale', password: 'plain green kettle sings' };
    await test
      .visitor()
      .post('/api/invitations/accept')
      .send({ ...accept, role: 'administrator' })
      .expect(422);
    await test
      .visitor()
      .post('/api/invitations/accept')
      .send({ ...accept, password: 'passwordpassword' })
      .expect(422);
    await test.visitor().post('/api/invitations/accept').send(accept).expect(200);
    await test.visitor().post('/api/invitations/accept').send(accept).expect(410);
    const session = await test
      .visitor()
      .post('/api/session')
      .send({ email, password: accept.password })
      .expect(200);
    expect(session.body).toMatchObject({ role: 'applicant', organisation: { id: applicants.id } });
  });

  it('is not stored in a form that opens the account', async () => {
    const email = 'hashed@example.org';
    await administrator.post('/api/invitations', {
      email,
      name: 'Hash',
      organisationId: applicants.id,
      role: 'applicant',
    });
    const [row] = await test.db.owner.query<{ token_hash: string }[]>(
      'SELECT token_hash FROM invitations WHERE email = $1',
      [email],
    );
    expect(row?.token_hash).toMatch(/^[0-9a-f]{64}$/);
    expect(row?.token_hash).not.toBe(await tokenFor(email));
  });

  it('runs out after thirty minutes and can be sent again', async () => {
    const email = 'late@example.org';
    const body = { email, name: 'Late', organisationId: applicants.id, role: 'applicant' };
    const { id } = (await administrator.post('/api/invitations', body)).body as { id: string };
    const first = await tokenFor(email);
    test.db.clock.advance(30 * 60_000);
    const accept = { name: 'Late', password: 'plain green kettle sings' };
    await test
      .visitor()
      .post('/api/invitations/accept')
      .send({ ...accept, token: first })
      .expect(410);
    await administrator
      .post(`/api/invitations/${id}/approve`, { organisationId: applicants.id, role: 'applicant' })
      .expect(200);
    await test
      .visitor()
      .post('/api/invitations/accept')
      .send({ ...accept, token: await tokenFor(email) })
      .expect(200);
  });

  it('fits roles to organisations', async () => {
    const wrong = [
      { organisationId: applicants.id, role: 'reviewer' },
      { organisationId: applicants.id, role: 'administrator' },
      { organisationId: test.owner.id, role: 'applicant' },
    ];
    for (const body of wrong) {
      const answer = await administrator.post('/api/invitations', {
        email: 'w@example.org',
        name: 'W',
        ...body,
      });
      expect(answer.body).toMatchObject({ status: 422, errors: [{ pointer: '/role' }] });
    }
  });

  it('taken back opens nothing', async () => {
    const email = 'back@example.org';
    const body = { email, name: 'Back', organisationId: applicants.id, role: 'applicant' };
    const { id } = (await administrator.post('/api/invitations', body)).body as { id: string };
    const token = await tokenFor(email);
    await administrator.post(`/api/invitations/${id}/refuse`, { reason: 'wrong person' }).expect(200);
    await administrator.post(`/api/invitations/${id}/refuse`, { reason: 'again' }).expect(409);
    const accept = { token, name: 'Back', password: 'plain green kettle sings' };
    await test.visitor().post('/api/invitations/accept').send(accept).expect(410);
  });
});

describe('an account that is asked for', () => {
  const wish = {
    email: 'asks@example.org',
    name: 'Ash Keld',
    organisation: 'Keld Solar',
    message: 'We file in May.',
  };

  it('waits for an administrator, and the answer tells nothing about existing accounts', async () => {
    const known = { ...wish, email: administrator.email };
    const [first, second] = [
      await test.visitor().post('/api/account-requests').send(wish).expect(202),
      await test.visitor().post('/api/account-requests').send(known).expect(202),
    ];
    expect(second.body).toEqual(first.body);
    const list = (await administrator.get('/api/invitations')).body as {
      items: { id: string; email: string; status: string }[];
    };
    const asked = list.items.find((item) => item.email === wish.email);
    expect(asked).toMatchObject({ status: 'asked' });
    const approval = { organisationId: applicants.id, role: 'applicant' };
    await administrator.post(`/api/invitations/${asked?.id}/approve`, approval).expect(200);
    expect(await acts()).toBe('account.approved');
    const accept = {
      token: await tokenFor(wish.email),
      name: wish.name,
      password: 'plain green kettle sings',
    };
    await test.visitor().post('/api/invitations/accept').send(accept).expect(200);
  });
});

describe('roles', () => {
  it('are granted and taken away by an administrator, and count with the next request', async () => {
    const client = await test.signInAs('reviewer');
    const path = `/api/people/${client.actor.userId}/memberships/${test.owner.id}`;
    const granted = await administrator.put(path, { role: 'administrator' }).expect(200);
    expect(granted.body).toMatchObject({ memberships: [{ role: 'administrator' }] });
    expect(await acts()).toBe('role.granted');
    await client.get('/api/people').expect(401);
    const removed = await administrator.delete(path).expect(200);
    expect(removed.body).toMatchObject({ memberships: [] });
    await test.visitor().post('/api/session').send({ email: client.email, password: PASSWORD }).expect(401);
  });

  it('are never changed for oneself', async () => {
    const path = `/api/people/${administrator.actor.userId}/memberships/${test.owner.id}`;
    await administrator.put(path, { role: 'reviewer' }).expect(403);
    await administrator.delete(path).expect(403);
    await administrator
      .put(`/api/people/${administrator.actor.userId}/status`, { status: 'disabled', reason: 'no' })
      .expect(403);
  });

  it('of an account that is shut out are worth nothing, at once', async () => {
    const client = await test.signInAs('applicant');
    const path = `/api/people/${client.actor.userId}/status`;
    await administrator.put(path, { status: 'disabled', reason: 'has left' }).expect(200);
    expect((await client.get('/api/session')).body).toMatchObject({ user: null });
    await administrator.put(path, { status: 'disabled', reason: 'again' }).expect(409);
    await administrator.put(path, { status: 'active', reason: 'is back' }).expect(200);
    await test.visitor().post('/api/session').send({ email: client.email, password: PASSWORD }).expect(200);
  });

  it('keep a barred reviewer’s bar in the session', async () => {
    const client = await test.signInAs('reviewer');
    const bar = { organisationId: applicants.id, reason: 'worked there until May' };
    await administrator.post(`/api/people/${client.actor.userId}/bars`, bar).expect(201);
    await administrator.post(`/api/people/${client.actor.userId}/bars`, bar).expect(409);
    expect((await client.get('/api/session')).body).toMatchObject({ barredOrganisationIds: [applicants.id] });
  });

  it('of unknown people and organisations are not found', async () => {
    const nobody = '00000000-0000-4000-8000-000000000000';
    await administrator
      .put(`/api/people/${nobody}/memberships/${applicants.id}`, { role: 'applicant' })
      .expect(404);
    await administrator
      .put(`/api/people/not-an-id/memberships/${applicants.id}`, { role: 'applicant' })
      .expect(404);
  });
});

describe('a forgotten password', () => {
  it('is replaced by a link that works once, and the newest only', async () => {
    const client = await test.signInAs('applicant');
    const ask = () => test.visitor().post('/api/password-resets').send({ email: client.email }).expect(202);
    await ask();
    const older = await tokenFor(client.email);
    test.db.clock.advance(1000);
    const known = await ask();
    const unknown = await test
      .visitor()
      .post('/api/password-resets')
      .send({ email: 'nobody@example.org' })
      .expect(202);
    expect(unknown.body).toEqual(known.body);
    const newer = await tokenFor(client.email);
    const use = (token: string) =>
      test.visitor().post('/api/password-resets/use').send({ token, password: 'nine loud rooks argue' });
    await use(older).expect(410);
    await use(newer).expect(200);
    await use(newer).expect(410);
    expect((await client.get('/api/session')).body).toMatchObject({ user: null });
  });

  it('sends nothing to an address without an account', async () => {
    await test.visitor().post('/api/password-resets').send({ email: 'stranger@example.org' }).expect(202);
    expect(await test.db.owner.manager.countBy(OutboxMail, { recipient: 'stranger@example.org' })).toBe(0);
  });
});

describe('organisations', () => {
  it('are made once for one Idempotency-Key', async () => {
    const send = (name: string, key: string) =>
      administrator.post('/api/organisations', { name }).set('Idempotency-Key', key);
    const first = await send('Keld Moss Solar', 'key-1').expect(201);
    const again = await send('Keld Moss Solar', 'key-1').expect(201);
    expect(again.body).toEqual(first.body);
    expect(again.headers['idempotency-replayed']).toBe('true');
    expect((await send('Another', 'key-1')).body).toMatchObject({
      status: 422,
      type: '/problems/key-reused',
    });
    await send('Keld Moss Solar', 'key-2').expect(409);
    test.db.clock.advance(24 * 3_600_000);
  });
});

describe('the first-run set-up', () => {
  it('makes the owner and an administrator with the token, once', async () => {
    const bare = await makeTestApp({ demo: false, setUpToken: 'a-token-of-the-first-start' });
    try {
      await bare.db.owner.query('DELETE FROM organisations');
      expect((await bare.visitor().get('/api/session')).body).toMatchObject({ setUpNeeded: true });
      const person = { name: 'Ada Thorne', email: 'ada@example.org', password: 'plain green kettle sings' };
      const body = { token: 'a-token-of-the-first-start', organisation: 'Fellside Grid', ...person };
      await bare
        .visitor()
        .post('/api/set-up')
        .send({ ...body, token: 'a-token-that-is-wrong-here' })
        .expect(410);
      await bare.visitor().post('/api/set-up').send(body).expect(201);
      await bare
        .visitor()
        .post('/api/set-up')
        .send({ ...body, email: 'eve@example.org' })
        .expect(410);
      const { email, password } = person;
      const session = await bare.visitor().post('/api/session').send({ email, password }).expect(200);
      expect(session.body).toMatchObject({
        role: 'administrator',
        gridOwner: { name: 'Fellside Grid' },
        setUpNeeded: false,
      });
    } finally {
      await bare.close();
    }
  });

  it('does not exist in the demo', async () => {
    const person = { name: 'Ada Thorne', email: 'ada@example.org', password: 'plain green kettle sings' };
    await test
      .visitor()
      .post('/api/set-up')
      .send({ token: 'x'.repeat(30), organisation: 'Mine', ...person })
      .expect(410);
  });
});
