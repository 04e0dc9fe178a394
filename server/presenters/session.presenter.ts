import type { Session } from '../../shared/contracts/api.generated';
import type { Context } from '../integrations/context';
import type { Transaction } from '../database/transaction';
import { User } from '../entities/people.entities';
import type { SessionState } from '../integrations/session-door';
import {
  barsOf,
  findGridOwner,
  findUser,
  hasSecondFactor,
  membershipsOf,
} from '../repositories/people.repository';

const NOBODY = {
  user: null,
  role: null,
  organisation: null,
  memberships: [],
  barredOrganisationIds: [],
  csrfToken: null,
  next: null,
} as const;

/** What may be shown before anybody is signed in. */
async function surroundingsOf(tx: Transaction, { config, setUpToken }: Context) {
  const owner = await findGridOwner(tx.manager);
  const setUpNeeded = setUpToken !== null && !(await tx.manager.exists(User));
  return { gridOwner: owner ? { name: owner.name } : null, demo: config.demo, setUpNeeded };
}

/** The session as the client sees it. Needs the product's own sight: it names all organisations of the person. */
export async function presentSession(
  tx: Transaction,
  context: Context,
  state: SessionState | null,
): Promise<Session> {
  const around = await surroundingsOf(tx, context);
  if (!state) return { ...NOBODY, memberships: [], barredOrganisationIds: [], ...around };
  if (state.stage === 'half') {
    const next = (await hasSecondFactor(tx.manager, state.userId)) ? 'totp' : 'totp-enrolment';
    return {
      ...NOBODY,
      memberships: [],
      barredOrganisationIds: [],
      csrfToken: state.csrfToken,
      next,
      ...around,
    };
  }
  const user = await findUser(tx.manager, state.userId);
  const memberships = await membershipsOf(tx.manager, [state.userId]);
  const active = memberships.find((row) => row.orgId === state.orgId);
  if (!user || user.status !== 'active' || !active) {
    return { ...NOBODY, memberships: [], barredOrganisationIds: [], ...around };
  }
  const bars = active.role === 'reviewer' ? await barsOf(tx.manager, [user.id]) : [];
  return {
    user: { id: user.id, name: user.displayName, email: user.email },
    role: active.role,
    organisation: { id: active.orgId, name: active.organisationName, kind: active.organisationKind },
    memberships: memberships.map(({ orgId, organisationName, role }) => ({
      organisationId: orgId,
      organisationName,
      role,
    })),
    barredOrganisationIds: bars.map((bar) => bar.orgId),
    csrfToken: state.csrfToken,
    next: null,
    ...around,
  };
}
