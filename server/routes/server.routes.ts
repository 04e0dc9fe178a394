import { bareRoute } from './route';
import { requireReady } from './readiness';

/** The server itself: whether it lives, whether it can work, what it offers. */
export const serverRoutes = [
  bareRoute('getLive', {
    summary: 'Whether the process answers; asks nobody else',
    answers: { 200: 'health' },
    handler: async () => ({ status: 'live' }),
  }),
  bareRoute('getReady', {
    summary: 'Whether the database answers and is of the present shape',
    answers: { 200: 'health' },
    handler: async (context) => {
      await requireReady(context);
      return { status: 'ready' };
    },
  }),
  bareRoute('getOpenApi', {
    summary: 'This description',
    answers: { 200: 'openapi' },
    handler: async (_context, request) => (request.app.locals as { openApi: unknown }).openApi,
  }),
];
