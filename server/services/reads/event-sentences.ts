type After = Readonly<Record<string, unknown>>;

const text = (after: After, key: string) => {
  const value = after[key];
  return typeof value === 'string' || typeof value === 'number' ? String(value) : '';
};

const because = (after: After) => (text(after, 'reason') === '' ? '' : `: ${text(after, 'reason')}`);

/** Each act as a sentence; `who` is the person's name. */
const SENTENCES: Readonly<Record<string, (who: string, after: After) => string>> = {
  'application.created': (who) => `${who} created the application`,
  'application.updated': (who) => `${who} changed its particulars`,
  'application.filed': (who, a) => `${who} filed revision ${text(a, 'revision')}`,
  'application.taken': (who) => `${who} took the case`,
  'application.handed-over': (who, a) => `${who} handed the case over to ${text(a, 'reviewer')}${because(a)}`,
  'application.put-back': (who, a) => `${who} put the case back${because(a)}`,
  'application.returned': (who, a) => `${who} returned revision ${text(a, 'revision')}`,
  'application.accepted': (who, a) => `${who} accepted revision ${text(a, 'revision')}${because(a)}`,
  'application.declined': (who, a) => `${who} declined revision ${text(a, 'revision')}${because(a)}`,
  'application.withdrawn': (who, a) => `${who} withdrew the application${because(a)}`,
  'application.amended': (who, a) => `${who} opened an amendment${because(a)}`,
  'line.added': (who, a) => `${who} added ${text(a, 'lineKey')}`,
  'line.removed': (who) => `${who} removed a line`,
  'lines.imported': (who, a) => `${who} took ${text(a, 'lines')} lines from ${text(a, 'fileName')}`,
  'check.done': (_, a) => `The check of revision ${text(a, 'revision')} is done`,
  'check.asked': (who, a) => `${who} had revision ${text(a, 'revision')} checked again`,
  'check.adopted': (who, a) => `${who} adopted run ${text(a, 'run')}${because(a)}`,
  'discrepancy.raised': (who, a) => `${who} raised D-${text(a, 'number')}, ${text(a, 'title')}`,
  'discrepancy.answered': (who, a) => `${who} answered D-${text(a, 'number')}`,
  'discrepancy.settled': (who, a) => `${who} settled D-${text(a, 'number')}`,
  'discrepancy.reopened': (who, a) => `${who} asked again on D-${text(a, 'number')}`,
  'discrepancy.waived': (_, a) => `D-${text(a, 'number')} is waived with its findings`,
  'discrepancy.commented': (who, a) => `${who} wrote on D-${text(a, 'number')}`,
  'finding.waived': (who, a) => `${who} waived ${text(a, 'finding')}${because(a)}`,
  'finding.set-aside': (who, a) => `${who} set ${text(a, 'finding')} aside${because(a)}`,
  'waiver.proposed': (who, a) => `${who} proposed to waive ${text(a, 'finding')}${because(a)}`,
  'decline.proposed': (who, a) => `${who} proposed to decline${because(a)}`,
  'countersign.granted': (who, a) =>
    `${who} agreed to the ${text(a, 'subject') === 'decline' ? 'decline' : 'waiver'}`,
  'countersign.refused': (who, a) =>
    `${who} refused the ${text(a, 'subject') === 'decline' ? 'decline' : 'waiver'}`,
  'attachment.added': (who, a) => `${who} attached ${text(a, 'fileName')}`,
};

/** An entry of the trail as a sentence. */
export function eventSentence(act: string, who: string, after: After): string {
  const sentence = SENTENCES[act]?.(who, after) ?? `${who}: ${act.replaceAll('.', ' ')}`;
  return /[.!?]$/.test(sentence) ? sentence : `${sentence}.`;
}
