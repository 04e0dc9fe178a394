// npm run new:migration -- some-name: writes what the entities want beyond the present database as a migration.
import { readdirSync, writeFileSync } from 'node:fs';
import { makeDataSource } from '../database/data-source';
import { ownerDatabaseUrl } from './owner-database';

const FOLDER = 'server/database/migrations';
const pascal = (name: string) =>
  name.replace(/(^|-)([a-z])/g, (_all, _dash, letter: string) => letter.toUpperCase());

function migrationText(className: string, up: readonly string[]): string {
  const steps = up.map((sql) => `    await runner.query(${JSON.stringify(sql)});`).join('\n');
  return `import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What it is for, in one sentence. */
export class ${className} implements MigrationInterface {
  name = '${className}';

  async up(runner: QueryRunner): Promise<void> {
${steps}
  }

  async down(): Promise<void> {
    throw new Error('migrations only go forward: restore a backup instead');
  }
}
`;
}

async function wantedChanges(): Promise<string[]> {
  const { url, release } = await ownerDatabaseUrl();
  const owner = makeDataSource(url, 'owner');
  try {
    await owner.initialize();
    const drift = await owner.driver.createSchemaBuilder().log();
    return drift.upQueries.map((query) => query.query);
  } finally {
    if (owner.isInitialized) await owner.destroy();
    await release();
  }
}

const [name] = process.argv.slice(2);
if (!name || !/^[a-z][a-z0-9-]+$/.test(name)) {
  console.error('usage: npm run new:migration -- some-name');
  process.exit(2);
}
const number = readdirSync(FOLDER).filter((file) => /^\d{4}-/.test(file)).length + 1;
const file = `${FOLDER}/${String(number).padStart(4, '0')}-${name}.ts`;
const changes = await wantedChanges();
writeFileSync(file, migrationText(`${pascal(name)}${Date.now()}`, changes));
console.log(
  `wrote ${file} with ${changes.length} statements; say what it is for, add grants, row security and triggers, list it in migration-list.ts`,
);
