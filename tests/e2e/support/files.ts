import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** Files on disk for uploads, gone with their folder when the tests end. */
export function fileFolder(): { write(name: string, content: string | Buffer): string; remove(): void } {
  const folder = mkdtempSync(join(tmpdir(), 'counterpoise-e2e-'));
  return {
    write(name, content) {
      const path = join(folder, name);
      writeFileSync(path, content);
      return path;
    },
    remove: () => rmSync(folder, { recursive: true, force: true }),
  };
}
