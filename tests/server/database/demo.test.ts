import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { verifyChain } from '#server/database/audit/verify-chain';
import { seedDemo } from '#server/database/seeds/demo';
import { User } from '#server/entities/people.entities';
import { DEMO_ACCOUNTS, DEMO_PASSWORD } from '#server/services/accounts/demo-accounts';
import { passwordMatches } from '#server/services/session/passwords';
import { makeTestDatabase, type TestDatabase } from '../../support/test-database';

let db: TestDatabase;
const NOW = new Date('2027-03-04T09:30:00Z');
const PUBLIC_URL = new URL('http://127.0.0.1:8080');

beforeAll(async () => {
  db = await makeTestDatabase();
  expect(await seedDemo(db.owner, PUBLIC_URL, NOW)).toBe(true);
});
afterAll(() => db.close());

const query = <T>(text: string) => db.owner.query<T[]>(text);

interface FoundRow {
  line: string;
  grade: string;
  code: string;
  cause: string | null;
}

/** Findings of first revisions, the gravest first. */
const found = (line: string) =>
  query<FoundRow>(`
    SELECT c.name AS line, f.grade, f.code, f.causes->0->>'code' AS cause
    FROM revisions v JOIN revision_lines l ON l.revision_id = v.id
    JOIN line_versions c ON c.org_id = l.org_id AND c.hash = l.line_hash
    JOIN check_runs r ON r.revision_id = v.id AND r.governing
    JOIN findings f ON f.run_id = r.id AND f.line_key = l.line_key AND f.follows IS NULL
    WHERE v.ordinal = 1 AND c.name = '${line}' ORDER BY f.ordinal`);

describe('the demo scenario', () => {
  it('has a dozen applications of three organisations in every state, and about forty lines', async () => {
    const [counts] = await query<{ applications: number; orgs: number; lines: number; kv: number[] }>(`
      SELECT (SELECT count(*)::int FROM applications) AS applications,
        (SELECT count(DISTINCT org_id)::int FROM applications) AS orgs,
        (SELECT count(DISTINCT name)::int FROM line_versions) AS lines,
        (SELECT array_agg(DISTINCT nominal_voltage_kv ORDER BY nominal_voltage_kv) FROM line_versions) AS kv`);
    expect(counts?.applications).toBeGreaterThanOrEqual(12);
    expect(counts?.orgs).toBe(3);
    expect(counts?.lines).toBeGreaterThanOrEqual(38);
    expect(counts?.kv).toEqual([115, 138, 230, 345, 500]);
    const states = await query<{ state: string }>('SELECT DISTINCT state FROM rounds ORDER BY state');
    expect(states.map((row) => row.state)).toEqual([
      'accepted',
      'declined',
      'draft',
      'filed',
      'in-review',
      'returned',
      'withdrawn',
    ]);
  });

  it('was made by filing: every run is the checker’s own, with its report and its mail', async () => {
    const [runs] = await query<{ revisions: number; done: number; reports: number; receipts: number }>(`
      SELECT (SELECT count(*)::int FROM revisions) AS revisions,
        (SELECT count(*)::int FROM check_runs WHERE status = 'done') AS done,
        (SELECT count(*)::int FROM check_runs WHERE report IS NOT NULL) AS reports,
        (SELECT count(DISTINCT cause_id)::int FROM outbox WHERE kind = 'receipt') AS receipts`);
    expect(runs?.revisions).toBeGreaterThan(12);
    expect(runs).toMatchObject({
      done: runs?.revisions,
      reports: runs?.revisions,
      receipts: runs?.revisions,
    });
    expect((await verifyChain(db.owner)).whole).toBe(true);
  });

  it.each([
    ['Fellgate – Sarn', 'geometry.x1', 'per-mile'],
    ['Harrow Fell – Fellgate', 'geometry.b1', 'half-charging'],
    ['Fellgate – Skell Edge', 'geometry.x1', 'total'],
    ['Lang Knott – Sarn', 'geometry.x1', 'single-conductor'],
    ['Wexmoor – Tarn Moss', 'geometry.x1', 'frequency'],
    ['Lintgarth – Harrow Fell', 'geometry.r1', 'per-mile'],
    ['Lintgarth – Skell Edge', 'geometry.x1', 'position'],
    ['Aldbeck – Aldbeck Quarry', 'drawing.geometry-missing', null],
  ])('%s is found out: %s, %s', async (line, code, cause) => {
    const findings = await found(line);
    expect(findings.filter((f) => f.grade === 'must-answer').map((f) => f.code)).toContain(code);
    const causes = findings.map((f) => f.cause).filter((c) => c !== null);
    expect(causes[0] ?? null).toBe(cause);
  });

  it.each([
    'Harrow Fell – Sarn',
    'Skerrow – Lang Knott',
    'Cairnside – Cairnside Rail',
    'Ullscar Foot – Ullscar Dam',
  ])('%s is honest, and nothing must be answered', async (line) => {
    expect((await found(line)).filter((f) => f.grade === 'must-answer')).toEqual([]);
  });

  it('has lines that ask for an explanation, and no more', async () => {
    const findings = await found('Sarn – Tarn Moss');
    expect(new Set(findings.map((f) => f.grade))).toContain('explain');
    expect(findings.map((f) => f.grade)).not.toContain('must-answer');
  });

  it('has something overdue, something due soon and a proposal that waits for a second reviewer', async () => {
    const [due] = await query<{ over: number; coming: number; waiting: number }>(`
      SELECT count(*) FILTER (WHERE due_at < '${NOW.toISOString()}')::int AS over,
        count(*) FILTER (WHERE due_at >= '${NOW.toISOString()}')::int AS coming,
        (SELECT count(*)::int FROM countersigns WHERE outcome = 'pending') AS waiting
      FROM windows WHERE closed_at IS NULL`);
    expect(due?.over).toBeGreaterThan(0);
    expect(due?.coming).toBeGreaterThan(3);
    expect(due?.waiting).toBe(1);
  });

  it('lets its people in, with the consultant in two organisations', async () => {
    for (const { email } of DEMO_ACCOUNTS.slice(0, 2)) {
      const user = await db.owner.manager.findOneByOrFail(User, { emailKey: email });
      expect(await passwordMatches(user.passwordHash, DEMO_PASSWORD)).toBe(true);
    }
    const [aske] = await query<{ count: number }>(`
      SELECT count(*)::int FROM memberships m JOIN users u ON u.id = m.user_id WHERE u.display_name = 'R. Aske'`);
    expect(aske?.count).toBe(2);
  });

  it('is filled once', async () => {
    expect(await seedDemo(db.owner, PUBLIC_URL, NOW)).toBe(false);
  });
});
