import type { MigrationInterface, QueryRunner } from 'typeorm';
import { CASE_TABLES } from './first/case-tables';
import { CORRESPONDENCE_TABLES } from './first/correspondence-tables';
import { FILE_TABLES } from './first/file-tables';
import { FILED_TABLES } from './first/filed-tables';
import { FOREIGN_KEYS } from './first/foreign-keys';
import { GRANTS } from './first/grants';
import { PEOPLE_TABLES } from './first/people-tables';
import { PROTECTIONS } from './first/protections';
import { RECORD_TABLES } from './first/record-tables';
import { REVIEW_TABLES } from './first/review-tables';
import { ROW_SECURITY } from './first/row-security';
import { RULES_TABLES } from './first/rules-tables';
import { VERDICT_TABLES } from './first/verdict-tables';

/** The whole data model with its walls: tables, keys, row security, append-only triggers, grants. */
export class First1764547200000 implements MigrationInterface {
  name = 'First1764547200000';

  async up(runner: QueryRunner): Promise<void> {
    const steps = [
      ...PEOPLE_TABLES,
      ...CASE_TABLES,
      ...FILED_TABLES,
      ...RULES_TABLES,
      ...VERDICT_TABLES,
      ...REVIEW_TABLES,
      ...CORRESPONDENCE_TABLES,
      ...FILE_TABLES,
      ...RECORD_TABLES,
      ...FOREIGN_KEYS,
      ...ROW_SECURITY,
      ...PROTECTIONS,
      ...GRANTS,
    ];
    for (const step of steps) await runner.query(step);
  }

  async down(): Promise<void> {
    throw new Error('the first migration is not undone: drop the database instead');
  }
}
