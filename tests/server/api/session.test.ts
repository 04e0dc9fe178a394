import { generate } from 'otplib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { anOrganisation, aMembership } from '../../support/people';
import { makeTestApp, PASSWORD } from '../../support/test-app';
import type { TestApp } from '../../support/test-app';

let test: TestApp;
beforeAll(async () => {
  test = await makeTestApp();
});
afterAll(() => test.close());

const cookieOf = (answer: { headers: Record<string, unknown> }) =>
  String((answer.headers['set-cookie'] as string[] | undefined)?.[0] ?? '');

describe('signing in', () => {
  it('answers who is signed in, with the token for writes', async () => {
    const client = await test.signInAs('applicant');
    const { body } = await client.get('/api/session').expect(200);
    expect(body).toMatchObject({
      user: { id: client.actor.userId, email: client.email },
      role: 'applicant',
      organisation: { id: client.actor.orgId },
      csrfToken: client.csrfToken,
      gridOwner: { name: 'Grid owner' },
    });
  });

  it('shows a visitor nobody, and keeps no session for that', async () => {
    const answer = await test.visitor().get('/api/session').expect(200);
    expect(answer.body).toMatchObject({ user: null, csrfToken: null });
    expect(answer.headers['set-cookie']).toBeUndefined();
  });

  it('sets a cookie that scripts cannot read and other sites do not send', async () => {
    const { email } = await test.account('applicant', await test.db.asSystem((tx) => anOrganisation(tx)));
    const cookie = cookieOf(await test.visitor().post('/api/session').send({ email, password: PASSWORD }));
    expect(cookie).toMatch(/^cp=/);
    expect(cookie).toMatch(/; Path=\/;.*HttpOnly; SameSite=Lax$/);
    expect(cookie).not.toMatch(/Domain/);
  });

  it('answers unknown name, wrong password and disabled account alike', async () => {
    const org = await test.db.asSystem((tx) => anOrganisation(tx));
    const known = await test.account('applicant', org);
    const disabled = await test.account('applicant', org);
    await test.db.owner.query(`UPDATE users SET status = 'disabled' WHERE id = $1`, [disabled.actor.userId]);
    const answers = [];
    for (const [email, password] of [
      ['nobody@example.org', PASSWORD],
      [known.email, 'not the password'],
      [disabled.email, PASSWORD],
    ]) {
      const { status, body } = await test.visitor().post('/api/session').send({ email, password });
      answers.push({ status, ...(body as object), requestId: undefined });
    }
    expect(answers[0]).toMatchObject({ status: 401, type: '/problems/sign-in-refused' });
    expect(answers[1]).toEqual(answers[0]);
    expect(answers[2]).toEqual(answers[0]);
  });

  it('gives a new id at sign-in, so that a planted cookie is worth nothing', async () => {
    const agent = test.visitor();
    const { email } = await test.account('applicant', await test.db.asSystem((tx) => anOrganisation(tx)));
    const first = cookieOf(await agent.post('/api/session').send({ email, password: PASSWORD }));
    const second = cookieOf(await agent.post('/api/session').send({ email, password: PASSWORD }));
    expect(second).not.toEqual(first);
    const old = await test
      .visitor()
      .get('/api/session')
      .set('Cookie', first.split(';')[0] ?? '');
    expect(old.body).toMatchObject({ user: null });
  });

  it('stops counting guesses at ten from one address, and says when to come back', async () => {
    const { email } = await test.account('applicant', await test.db.asSystem((tx) => anOrganisation(tx)));
    for (let i = 0; i < 10; i++) {
      await test.visitor().post('/api/session').send({ email, password: 'a wrong guess' }).expect(401);
    }
    const answer = await test.visitor().post('/api/session').send({ email, password: PASSWORD }).expect(429);
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    await test.signInAs('applicant');
  });

  it('lets no more guesses through when they come all at once', async () => {
    const { email } = await test.account('applicant', await test.db.asSystem((tx) => anOrganisation(tx)));
    const guess = (password: string) => test.visitor().post('/api/session').send({ email, password });
    const answers = await Promise.all(Array.from({ length: 24 }, (_, i) => guess(`a wrong guess ${i}`)));
    const statuses = answers.map((answer) => answer.status);
    expect(statuses.filter((status) => status === 401).length).toBeLessThanOrEqual(10);
    expect(statuses.filter((status) => status === 429).length).toBeGreaterThanOrEqual(14);
    expect((await guess(PASSWORD)).status).toBe(429);
  });

  it.each([
    ['no password', { email: 'a@example.org' }, '/password'],
    ['an unknown key', { email: 'a@example.org', password: 'x', role: 'administrator' }, '/role'],
    ['a number for a text', { email: 'a@example.org', password: 12 }, '/password'],
    ['a password beyond all measure', { email: 'a@example.org', password: 'x'.repeat(129) }, '/password'],
  ])('refuses %s with the field', async (_name, body, pointer) => {
    const answer = await test.visitor().post('/api/session').send(body).expect(422);
    expect(answer.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect((answer.body as { errors: { pointer: string }[] }).errors[0]?.pointer).toBe(pointer);
  });
});

describe('a session', () => {
  it('ends with sign-out', async () => {
    const client = await test.signInAs('reviewer');
    const cookie = (await client.get('/api/session')).request.cookies;
    await client.delete('/api/session').expect(200);
    expect((await test.visitor().get('/api/session').set('Cookie', cookie)).body).toMatchObject({
      user: null,
    });
  });

  it('ends after eight hours whatever its use', async () => {
    const client = await test.signInAs('applicant');
    test.db.clock.advance(8 * 3_600_000 - 1000);
    expect((await client.get('/api/session')).body).toMatchObject({ role: 'applicant' });
    test.db.clock.advance(1000);
    expect((await client.get('/api/session')).body).toMatchObject({ user: null });
    await client
      .post('/api/session/password', { present: PASSWORD, password: 'a long enough one' })
      .expect(401);
  });

  it.each([
    ['applicant', 30],
    ['reviewer', 15],
    ['administrator', 15],
  ] as const)('of an %s lives %i minutes without use', async (role, minutes) => {
    const client = await test.signInAs(role);
    const [row] = await test.db.owner.query<{ left: number }[]>(
      `SELECT extract(epoch FROM expire - now()) / 60 AS left FROM sessions WHERE sess #>> '{passport,user}' = $1`,
      [client.actor.userId],
    );
    expect(Number(row?.left)).toBeGreaterThan(minutes - 1);
    expect(Number(row?.left)).toBeLessThan(minutes + 0.1);
    await test.db.owner.query(
      `UPDATE sessions SET expire = now() - interval '1 second' WHERE sess #>> '{passport,user}' = $1`,
      [client.actor.userId],
    );
    expect((await client.get('/api/session')).body).toMatchObject({ user: null });
  });

  it('loses the rights of a role that was taken away with the next request', async () => {
    const client = await test.signInAs('reviewer');
    await test.db.owner.query('DELETE FROM memberships WHERE user_id = $1', [client.actor.userId]);
    expect((await client.get('/api/session')).body).toMatchObject({ user: null });
    await client
      .post('/api/session/password', { present: PASSWORD, password: 'a long enough one' })
      .expect(401);
  });

  it('moves between the own organisations, under a new id, and to no other', async () => {
    const [first, second, foreign] = await test.db.asSystem(async (tx) => [
      await anOrganisation(tx),
      await anOrganisation(tx),
      await anOrganisation(tx),
    ]);
    if (!first || !second || !foreign) throw new Error('three organisations');
    const client = await test.signInAs('applicant', first);
    await test.db.asSystem((tx) =>
      aMembership(tx, { id: client.actor.userId } as never, second, 'applicant'),
    );
    await client.put('/api/session/organisation', { organisationId: foreign.id }).expect(404);
    const answer = await client.put('/api/session/organisation', { organisationId: second.id }).expect(200);
    expect(answer.body).toMatchObject({ organisation: { id: second.id } });
    expect((answer.body as { csrfToken: string }).csrfToken).not.toBe(client.csrfToken);
    // The token of the session that was left is worth nothing in the new one.
    await client.put('/api/session/organisation', { organisationId: first.id }).expect(403);
  });

  it('takes a new password, and ends the other sessions of the person', async () => {
    const client = await test.signInAs('applicant');
    const elsewhere = test.visitor();
    await elsewhere.post('/api/session').send({ email: client.email, password: PASSWORD }).expect(200);
    const password = 'seven grey stones sink';
    await client.post('/api/session/password', { present: 'not this one', password }).expect(422);
    await client
      .post('/api/session/password', { present: PASSWORD, password: 'passwordpassword' })
      .expect(422);
    await client.post('/api/session/password', { present: PASSWORD, password }).expect(200);
    expect((await elsewhere.get('/api/session')).body).toMatchObject({ user: null });
    expect((await client.get('/api/session')).body).toMatchObject({ role: 'applicant' });
    await test.visitor().post('/api/session').send({ email: client.email, password: PASSWORD }).expect(401);
    await test.visitor().post('/api/session').send({ email: client.email, password }).expect(200);
  });
});

describe('a write', () => {
  const change = { present: PASSWORD, password: 'eight red kites circle' };

  it('needs the token of the own session', async () => {
    const client = await test.signInAs('applicant');
    const other = await test.signInAs('applicant');
    for (const token of [undefined, '', other.csrfToken]) {
      const request = client.agent.post('/api/session/password').send(change);
      if (token !== undefined) void request.set('X-CSRF-Token', token);
      expect((await request).body).toMatchObject({ status: 403, type: '/problems/cross-site' });
    }
  });

  it.each([
    ['Sec-Fetch-Site', 'cross-site'],
    ['Sec-Fetch-Site', 'same-site'],
    ['Origin', 'https://evil.example'],
    ['Origin', 'null'],
  ])('is refused when %s is %s, sign-in included', async (header, value) => {
    const client = await test.signInAs('applicant');
    await client.post('/api/session/password', change).set(header, value).expect(403);
    await test
      .visitor()
      .post('/api/session')
      .set(header, value)
      .send({ email: client.email, password: PASSWORD })
      .expect(403);
  });

  it('is taken as JSON only, so that no plain form can send it', async () => {
    const client = await test.signInAs('applicant');
    await client.agent
      .post('/api/session/password')
      .set('X-CSRF-Token', client.csrfToken)
      .type('text/plain')
      .send(JSON.stringify(change))
      .expect(415);
    await test
      .visitor()
      .post('/api/session')
      .type('form')
      .send({ email: client.email, password: PASSWORD })
      .expect(415);
  });
});

describe('the second factor', () => {
  let strict: TestApp;
  beforeAll(async () => {
    strict = await makeTestApp({ totpRequired: true });
  });
  afterAll(() => strict.close());

  it('is not asked of applicants', async () => {
    await strict.signInAs('applicant');
  });

  it('is enrolled on the first sign-in of the owner’s people and asked for from then on, each code once', async () => {
    const { email } = await strict.account('reviewer', strict.owner);
    const agent = strict.visitor();
    const epoch = () => Math.floor(strict.db.clock.now().getTime() / 1000);
    const first = await agent.post('/api/session').send({ email, password: PASSWORD }).expect(202);
    expect(first.body).toEqual({ next: 'totp-enrolment' });
    expect((await agent.get('/api/session')).body).toMatchObject({ user: null, next: 'totp-enrolment' });
    await agent
      .post('/api/session/password')
      .send({ present: PASSWORD, password: 'eight red kites circle' })
      .expect(401);
    const { secret } = (await agent.post('/api/session/totp-enrolment').expect(200)).body as {
      secret: string;
    };
    const code = await generate({ secret, epoch: epoch() });
    await agent
      .post('/api/session/totp')
      .send({ code: code === '000000' ? '000001' : '000000' })
      .expect(401);
    expect((await agent.post('/api/session/totp').send({ code }).expect(200)).body).toMatchObject({
      role: 'reviewer',
    });

    const again = strict.visitor();
    expect((await again.post('/api/session').send({ email, password: PASSWORD }).expect(202)).body).toEqual({
      next: 'totp',
    });
    await again.post('/api/session/totp').send({ code }).expect(401);
    await again.post('/api/session/totp-enrolment').expect(409);
    strict.db.clock.advance(60_000);
    await again
      .post('/api/session/totp')
      .send({ code: await generate({ secret, epoch: epoch() }) })
      .expect(200);
  });
});
