import { readLine } from '#shared/filing/read-filing';
import { solveLine } from '#shared/engine/index';
import { STARTING_LIBRARY } from '#shared/library/conductors';
import { CheckRun } from '#server/entities/verdict.entities';
import { runCheck } from '#server/services/filing/run-check';
import type * as Api from '#shared/contracts/api.generated';
import type { Client, TestApp } from './test-app';
import type { TestDatabase } from './test-database';

type Json = Record<string, unknown>;

const KV = 345;
const HZ = 60;

/** A flat 345 kV line of two conductors a phase, with the values that its own geometry gives. */
export function aLine(name: string, { x1Factor = 1, lengthKm = 40, earthGiven = true } = {}): Json {
  const heightM = 24;
  const phase = (letter: string, horizontalM: number) => ({
    circuit: 1,
    phase: letter,
    conductor: 'phase',
    horizontalM,
    attachmentHeightM: heightM,
    sagM: 9,
    bundleCount: 2,
    bundleSpacingM: 0.4572,
  });
  const line: Json = {
    name,
    from: 'Harrow Fell',
    to: 'Sarn',
    nominalVoltageKv: KV,
    frequencyHz: HZ,
    sections: [
      {
        kind: 'overhead',
        lengthKm,
        ...(earthGiven ? { earthResistivityOhmM: 100 } : {}),
        conductors: {
          phase: { library: 'Drake', temperatureC: 50 },
          ground: { name: 'steel', model: 'handbook', diameterMm: 9.14, gmrMm: 1, acResistanceOhmPerKm: 4 },
        },
        positions: [
          phase('a', -9),
          phase('b', 0),
          phase('c', 9),
          { groundWire: true, conductor: 'ground', horizontalM: -6.5, attachmentHeightM: 30, sagM: 7 },
          { groundWire: true, conductor: 'ground', horizontalM: 6.5, attachmentHeightM: 30, sagM: 7 },
        ],
      },
    ],
  };
  return { ...line, declared: [declaredFor(line, x1Factor)] };
}

/** Four significant digits, as people write them. */
const written = (value: number) => Number(value.toPrecision(4));

function declaredFor(line: Json, x1Factor: number): Json {
  const any = { value: 1, unit: 'ohm/km' };
  const draft = { ...line, declared: [{ circuit: 1, r1: any, x1: any, b1: { value: 1, unit: 'uS/km' } }] };
  const owner = { baseMva: 100, earthResistivityOhmM: 100 };
  const read = readLine(draft, { library: STARTING_LIBRARY, owner });
  if (!read.ok || read.line.engineInput === null) throw new Error('the sample line cannot be read');
  const solved = solveLine(read.line.engineInput, HZ);
  const [values] = solved.ok ? solved.value.circuits : [];
  if (values === undefined) throw new Error('the sample line cannot be computed');
  const ohm = (value: number) => ({ value: written(value), unit: 'ohm/km' });
  const siemens = (value: number) => ({ value: written(value), unit: 'uS/km' });
  return {
    circuit: 1,
    r1: ohm(values.r1),
    x1: ohm(values.x1 * x1Factor),
    b1: siemens(values.b1),
    r0: ohm(values.r0),
    x0: ohm(values.x0),
    b0: siemens(values.b0),
  };
}

/** Miles to the kilometre: a value per mile that is stated per kilometre is so many times too large. */
export const PER_MILE = 1.609344;

export const PARTICULARS = {
  title: 'Fellgate Wind',
  connectionKind: 'generation',
  capacityMw: 480,
  pointOfConnection: 'Sarn',
  contact: { name: 'P. Sandgate', email: 'sandgate@fellgate.example', phone: null },
} as const;

/** What a request answered; another status than the one expected fails with the answer's own words. */
export async function expecting<T>(
  status: number,
  request: PromiseLike<{ status: number; body: unknown; text: string }>,
): Promise<T> {
  const answer = await request;
  if (answer.status !== status) throw new Error(`${answer.status} instead of ${status}: ${answer.text}`);
  return answer.body as T;
}

/** An application in Draft with these lines. */
export async function aDraft(applicant: Client, lines: readonly Json[]): Promise<Api.Application> {
  const created = await expecting<Api.Application>(201, applicant.post('/api/applications', PARTICULARS));
  for (const [i, line] of lines.entries()) await saveLine(applicant, created.number, `L${i + 1}`, line, 0);
  return created;
}

export async function saveLine(
  applicant: Client,
  number: string,
  lineKey: string,
  line: Json,
  version: number,
): Promise<Api.DraftLine> {
  const path = `/api/applications/${number}/draft/lines/${lineKey}`;
  return expecting(200, applicant.put(path, { version, line }));
}

/** Does the worker's share: every check that waits. */
export async function runChecks(db: TestDatabase, tools = db.surroundings.tools): Promise<number> {
  const waiting = await db.owner.manager.findBy(CheckRun, { status: 'queued' });
  for (const run of waiting) await runCheck({ dataSource: db.worker, tools }, run.id);
  return waiting.length;
}

/** One step of a case, and what the application is after it. */
export function step(client: Client, number: string, name: string, body: object = {}, status = 200) {
  return expecting<Api.Application>(status, client.post(`/api/applications/${number}/${name}`, body));
}

/** A case that a reviewer has in review, filed by the applicant and checked. */
export async function aCaseInReview(
  { db }: TestApp,
  applicant: Client,
  reviewer: Client,
  lines: readonly Json[],
): Promise<string> {
  const { number } = await aDraft(applicant, lines);
  await step(applicant, number, 'file');
  await runChecks(db);
  await step(reviewer, number, 'take');
  return number;
}

/** Findings of the current revision. */
export async function findingsOf(client: Client, number: string, letter: string): Promise<Api.Finding[]> {
  const path = `/api/applications/${number}/revisions/${letter}`;
  return (await expecting<Api.Revision>(200, client.get(path))).findings;
}
