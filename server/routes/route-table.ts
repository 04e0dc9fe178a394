import type { Route } from '../app/route';
import { serverRoutes } from './server.routes';
import { sessionRoutes } from './session.routes';

/** Every address of the API. What is not in this table does not exist; the OpenAPI document is made from it. */
export const ROUTES: readonly Route[] = [...serverRoutes, ...sessionRoutes];
