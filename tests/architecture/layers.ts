/**
 * The rooms of the house from the ground up. A file may import from its own room and from rooms
 * above it in this list, never from one below; `client` and `server` rooms never meet.
 */
export interface Room {
  path: string;
  side: 'shared' | 'server' | 'client';
}

const rooms = (side: Room['side'], ...paths: string[]): Room[] => paths.map((path) => ({ path, side }));

export const LAYERS: readonly Room[] = [
  ...rooms(
    'shared',
    'schemas',
    'shared/numerics',
    'shared/units',
    'shared/contracts',
    'shared/format',
    'shared/engine',
    'shared/library',
    'shared/filing',
    'shared/workflow',
    'shared/policies',
    'shared/checks',
  ),
  ...rooms(
    'server',
    'server/errors',
    'server/config',
    'server/logging',
    'server/integrations',
    'server/integrations',
    'server/entities',
    'server/database',
    'server/policies',
    'server/repositories',
    'server/files',
    'server/presenters',
    'server/services',
    'server/workers',
    'server/jobs',
    'server/middleware',
    'server/routes',
    'server/database/seeds',
    'server/app',
    'server/main.ts',
    'server/scripts',
  ),
  ...rooms(
    'client',
    'src/styles',
    'src/lib',
    'src/hooks',
    'src/components/ui',
    'src/components/charts',
    'src/components/feedback',
    'src/features',
    'src/app/routes',
    'src/app',
  ),
];

/** The room that a file belongs to: the longest path of the list that begins the file's path. */
export function roomOf(file: string): number {
  let best = -1;
  LAYERS.forEach((room, i) => {
    const inside = file === room.path || file.startsWith(`${room.path}/`);
    if (inside && room.path.length > (LAYERS[best]?.path.length ?? 0)) best = i;
  });
  return best;
}

/** Why an import from one file to another is not allowed, or null where it is. */
export function importFault(from: string, to: string): string | null {
  const a = roomOf(from);
  const b = roomOf(to);
  const above = LAYERS[a];
  const below = LAYERS[b];
  if (!above) return `${from} is in no room of tests/architecture/layers.ts`;
  if (!below) return `${to} is in no room of tests/architecture/layers.ts`;
  if (below.side !== 'shared' && above.side !== below.side)
    return `${above.side} code imports ${below.side} code`;
  if (b > a) return `${above.path} imports upwards from ${below.path}`;
  const feature = (f: string) => f.match(/^src\/features\/([^/]+)\//)?.[1];
  if (feature(from) && feature(to) && feature(from) !== feature(to))
    return 'a feature imports another feature';
  return null;
}
