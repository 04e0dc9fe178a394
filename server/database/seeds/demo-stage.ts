import type { DataSource } from 'typeorm';
import type { UserActor } from '../actor';
import { inTransaction } from '../transaction';
import type { Surroundings } from '../../integrations/surroundings';
import { standInVirusScan } from '../../integrations/virus-scan';
import type { Caller } from '../../services/cases/caller';
import { runCheck } from '../../services/filing/run-check';
import { checkFiling } from '../../../shared/checks/check-filing';
import { isWorkingDay, type WorkCalendar } from '../../../shared/workflow/calendar';
import { defineAbility } from '../../../shared/policies/ability';

const DAY_MS = 86_400_000;
const CALENDAR: WorkCalendar = { timeZone: 'UTC', weekendDays: [0, 6], holidays: new Set() };

/** Where the demo is played: the product's own services, with a clock that can be set and checks made at once. */
export class Stage {
  private instant: Date;
  private readonly waiting: string[] = [];
  private readonly surroundings: Surroundings;

  constructor(
    owner: DataSource,
    publicUrl: URL,
    private readonly today: Date,
  ) {
    this.instant = today;
    this.surroundings = {
      dataSource: owner,
      tools: {
        clock: { now: () => this.instant },
        jobs: {
          send: async (_manager, _queue, id) => {
            this.waiting.push(id);
          },
        },
        virusScan: standInVirusScan,
        checker: {
          check: async ({ filing, rules }) => checkFiling(filing, rules, {}),
          close: async () => undefined,
        },
        publicUrl,
        demo: true,
      },
    };
  }

  /** So many working days ago, at a time of day. */
  ago(workingDays: number, time = '10:00'): Date {
    let day = this.today.getTime();
    for (let left = workingDays; left > 0;) {
      day -= DAY_MS;
      if (isWorkingDay(new Date(day).toISOString().slice(0, 10), CALENDAR)) left--;
    }
    const at = new Date(`${new Date(day).toISOString().slice(0, 10)}T${time}:00Z`);
    return at > this.today ? this.today : at;
  }

  /** Somebody does something at a moment, through the same door as a request. */
  async play<T>(at: Date, actor: UserActor, work: (caller: Caller) => Promise<T>): Promise<T> {
    this.instant = at;
    const result = await inTransaction(this.surroundings, actor, (tx) =>
      work({ tx, actor, ability: defineAbility(actor) }),
    );
    for (const run of this.waiting.splice(0)) {
      this.instant = new Date(at.getTime() + 20_000);
      await runCheck(this.surroundings, run);
    }
    return result;
  }
}
