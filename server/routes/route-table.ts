import type { Route } from './route';
import { accountRoutes } from './account.routes';
import { auditRoutes } from './audit.routes';
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
  ...mailRoomRoutes,
];
