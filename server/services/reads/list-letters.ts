import { notFound } from '../../errors/problem';
import { discrepanciesInLetters, letterWithBytes } from '../../repositories/correspondence.repository';
import { listLetters as findLetters, type LettersQuery } from '../../repositories/letter-list.repository';
import { decodeCursor, readLimit } from '../../repositories/paging';
import { namesOf } from '../../repositories/people-names.repository';
import { presentLetter } from '../../presenters/letter.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { readCase } from '../cases/case-file';

const ALL_OF_A_CASE = 200;

/** A page of the letters of all cases that the caller may see. */
export async function listLetters(caller: Caller, query: Api.ListLettersRequest): Promise<Api.LetterList> {
  return letterPage(caller, {
    applicationId: null,
    kind: query['filter[kind]'] ?? null,
    search: query['filter[search]'] ?? null,
    sort: query.sort ?? '-sent',
    limit: readLimit(query.limit),
    cursor: decodeCursor(query.cursor),
  });
}

/** Letters of one application, newest first. */
export async function listApplicationLetters(caller: Caller, reference: string): Promise<Api.LetterList> {
  const { application } = await readCase(caller, reference);
  return letterPage(caller, {
    applicationId: application.id,
    kind: null,
    search: null,
    sort: '-sent',
    limit: ALL_OF_A_CASE,
    cursor: null,
  });
}

async function letterPage(caller: Caller, query: LettersQuery): Promise<Api.LetterList> {
  const { tx, ability } = caller;
  const page = await findLetters(tx.manager, ability, query);
  const numbers = await discrepanciesInLetters(
    tx.manager,
    page.items.map((letter) => letter.id),
  );
  const people = await namesOf(
    tx.manager,
    page.items.map((letter) => letter.sentById),
  );
  return {
    ...page,
    items: page.items.map((letter) => presentLetter(letter, numbers.get(letter.id) ?? [], people)),
  };
}

/** The bytes of a letter as it was sent. */
export async function getLetter(caller: Caller, reference: string, number: number) {
  const { tx, ability } = caller;
  const { application } = await readCase(caller, reference);
  const letter = await letterWithBytes(tx.manager, ability, application.id, number);
  if (letter === null) throw notFound();
  return {
    bytes: letter.bytes,
    mediaType: letter.mediaType,
    fileName: `${application.number}-letter-${number}.pdf`,
  };
}
