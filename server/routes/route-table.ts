import type { Route } from './route';
import { applicationRoutes } from './application.routes';
import { correspondenceRoutes } from './correspondence.routes';
import { demoRoutes } from './demo.routes';
import { discrepancyRoutes } from './discrepancy.routes';
import { draftRoutes } from './draft.routes';
import { reviewRoutes } from './review.routes';
import { revisionRoutes } from './revision.routes';
import { rulesRoutes } from './rules.routes';
import { accountRoutes } from './account.routes';
import { auditRoutes } from './audit.routes';
import { calendarRoutes } from './calendar.routes';
import { mailRoomRoutes } from './mail-room.routes';
import { peopleRoutes } from './people.routes';
import { ruleDraftRoutes } from './rule-draft.routes';
import { serverRoutes } from './server.routes';
import { sessionRoutes } from './session.routes';

/** Every address of the API. What is not in this table does not exist; the OpenAPI document is made from it. */
export const ROUTES: readonly Route[] = [
  ...serverRoutes,
  ...sessionRoutes,
  ...accountRoutes,
  ...peopleRoutes,
  ...ruleDraftRoutes,
  ...auditRoutes,
  ...calendarRoutes,
  ...mailRoomRoutes,
  ...applicationRoutes,
  ...draftRoutes,
  ...reviewRoutes,
  ...discrepancyRoutes,
  ...revisionRoutes,
  ...correspondenceRoutes,
  ...rulesRoutes,
  ...demoRoutes,
];
