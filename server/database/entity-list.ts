import * as people from '../entities/people.entities';
import * as cases from '../entities/case.entities';
import * as filed from '../entities/filed.entities';
import * as rules from '../entities/rules.entities';
import * as verdicts from '../entities/verdict.entities';
import * as review from '../entities/review.entities';
import * as correspondence from '../entities/correspondence.entities';
import * as files from '../entities/file.entities';
import * as record from '../entities/record.entities';

/** Every table of the product. */
export const ENTITIES = [
  people,
  cases,
  filed,
  rules,
  verdicts,
  review,
  correspondence,
  files,
  record,
].flatMap((room) => Object.values(room));
