import type { UserActor } from '../actor';
import { findApplication } from '../../repositories/application.repository';
import { findingsOfRun, governingRun } from '../../repositories/run.repository';
import { latestRevision } from '../../repositories/revision.repository';
import { findDraftLine } from '../../repositories/draft.repository';
import { answerDiscrepancy } from '../../services/discrepancies/answer-discrepancy';
import { raiseDiscrepancy } from '../../services/discrepancies/raise-discrepancy';
import { settleDiscrepancy } from '../../services/discrepancies/settle-discrepancy';
import { createApplication } from '../../services/drafts/create-application';
import { saveDraftLine } from '../../services/drafts/save-draft-line';
import { fileApplication } from '../../services/filing/file-application';
import { returnApplication } from '../../services/review/return-application';
import { takeApplication } from '../../services/review/take-application';
import type { Caller } from '../../services/cases/caller';
import { readCase } from '../../services/cases/case-file';
import type { CreateApplicationRequest } from '../../../shared/contracts/api.generated';
import { demoLine, type LineSpec } from './demo-lines';
import type { Stage } from './demo-stage';

/** The finding of a line that a discrepancy is raised from: by its code, or the worst one. */
async function fingerprintOf(caller: Caller, id: string, lineKey: string, code?: string): Promise<string> {
  const { manager } = caller.tx;
  const application = await findApplication(manager, caller.ability, id);
  const revision = application && (await latestRevision(manager, application.id));
  const run = revision && (await governingRun(manager, revision.id));
  const findings = run ? await findingsOfRun(manager, run.id, lineKey) : [];
  const named = findings.filter((finding) => code === undefined || finding.code === code);
  const finding = named.find((f) => f.grade === 'must-answer') ?? named[0];
  if (finding === undefined) throw new Error(`${lineKey} of ${id} has no finding ${code ?? ''}`);
  return finding.fingerprint;
}

/** One application of the demo and what people do with it; every step goes through the product's services. */
export class DemoCase {
  private constructor(
    private readonly stage: Stage,
    readonly applicant: UserActor,
    readonly id: string,
    private readonly lines: LineSpec[],
  ) {}

  static async open(
    stage: Stage,
    at: Date,
    applicant: UserActor,
    request: Omit<CreateApplicationRequest, 'contact'>,
    lines: LineSpec[],
  ): Promise<DemoCase> {
    const email = `${applicant.name.split(' ').at(-1)?.toLowerCase() ?? 'somebody'}@applicant.example`;
    const contact = { name: applicant.name, email, phone: null };
    const id = await stage.play(at, applicant, (caller) =>
      createApplication(caller, { ...request, contact }),
    );
    const opened = new DemoCase(stage, applicant, id, lines);
    await stage.play(at, applicant, async (caller) => {
      for (const [i, line] of lines.entries()) await opened.write(caller, `L${i + 1}`, line);
    });
    return opened;
  }

  private async write(caller: Caller, lineKey: string, spec: LineSpec): Promise<void> {
    const { round } = await readCase(caller, this.id);
    const known = await findDraftLine(caller.tx.manager, round.id, lineKey);
    await saveDraftLine(caller, this.id, lineKey, { version: known?.version ?? 0, line: demoLine(spec) });
  }

  /** Puts a line right in the draft, or otherwise than before. */
  async change(at: Date, lineKey: string, changes: Partial<LineSpec>): Promise<void> {
    const index = Number(lineKey.slice(1)) - 1;
    const before = this.lines[index];
    if (before === undefined) throw new Error(`there is no ${lineKey}`);
    const spec = { ...before, ...changes };
    this.lines[index] = spec;
    await this.play(at, this.applicant, (caller) => this.write(caller, lineKey, spec));
  }

  play<T>(at: Date, actor: UserActor, work: (caller: Caller) => Promise<T>): Promise<T> {
    return this.stage.play(at, actor, work);
  }

  async file(at: Date, note?: string): Promise<void> {
    await this.play(at, this.applicant, (caller) => fileApplication(caller, this.id, { note }));
  }

  async take(at: Date, reviewer: UserActor): Promise<void> {
    await this.play(at, reviewer, (caller) => takeApplication(caller, this.id, {}));
  }

  async raise(
    at: Date,
    reviewer: UserActor,
    about: { line: string; code?: string; title: string; question: string; wanted?: string },
  ): Promise<number> {
    return this.play(at, reviewer, async (caller) => {
      const { title, question, wanted } = about;
      const fingerprints = [await fingerprintOf(caller, this.id, about.line, about.code)];
      const revision = await this.letter(caller);
      return raiseDiscrepancy(caller, this.id, { revision, fingerprints, title, question, wanted });
    });
  }

  async return(at: Date, reviewer: UserActor): Promise<void> {
    await this.play(at, reviewer, async (caller) =>
      returnApplication(caller, this.id, { revision: await this.letter(caller) }),
    );
  }

  async answer(at: Date, number: number, by: 'change' | 'explanation', text: string): Promise<void> {
    await this.play(at, this.applicant, (caller) => answerDiscrepancy(caller, this.id, number, { by, text }));
  }

  async settle(at: Date, reviewer: UserActor, number: number, text: string): Promise<void> {
    await this.play(at, reviewer, async (caller) =>
      settleDiscrepancy(caller, this.id, number, { revision: await this.letter(caller), text }),
    );
  }

  /** Letter of the current revision. */
  async letter(caller: Caller): Promise<string> {
    return (await readCase(caller, this.id)).revision?.letter ?? 'A';
  }

  /** Fingerprint of a finding of the current revision. */
  finding(caller: Caller, lineKey: string, code?: string): Promise<string> {
    return fingerprintOf(caller, this.id, lineKey, code);
  }
}
