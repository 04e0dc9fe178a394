import type { Application, CreateApplicationRequest } from '#shared/contracts/api.generated';

/** The head of an application as its form holds it. */
export interface ApplicationTexts {
  title: string;
  connectionKind: string;
  capacityMw: string;
  pointOfConnection: string;
  contactName: string;
  contactEmail: string;
  contactPhone: string;
}

export type ApplicationField = keyof ApplicationTexts;

/** The form of a new application, with whoever begins it as its contact. */
export const blankApplication = (contact: { name: string; email: string }): ApplicationTexts => ({
  title: '',
  connectionKind: '',
  capacityMw: '',
  pointOfConnection: '',
  contactName: contact.name,
  contactEmail: contact.email,
  contactPhone: '',
});

/** The form of an application as it stands. */
export const textsOf = (application: Application): ApplicationTexts => ({
  title: application.title,
  connectionKind: application.connectionKind,
  capacityMw: application.capacityMw === null ? '' : String(application.capacityMw),
  pointOfConnection: application.pointOfConnection,
  contactName: application.contact.name,
  contactEmail: application.contact.email,
  contactPhone: application.contact.phone ?? '',
});

const CAPACITY = /^\d+(\.\d+)?$/;
const needed = (text: string, sentence: string): string | undefined =>
  text.trim() === '' ? sentence : undefined;

/** What the form still lacks, field by field. */
export function applicationWishes(
  t: Readonly<Record<ApplicationField, string>>,
): Partial<Record<ApplicationField, string>> {
  const capacity = t.capacityMw.trim();
  return {
    title: needed(t.title, 'An application has a title.'),
    connectionKind: needed(t.connectionKind, 'Say what is to be connected.'),
    capacityMw:
      capacity === '' || CAPACITY.test(capacity) ? undefined : 'Write the capacity like 480 or 49.9, in MW.',
    pointOfConnection: needed(t.pointOfConnection, 'Name the substation or line to connect at.'),
    contactName: needed(t.contactName, 'Say whom to ask.'),
    contactEmail: /^\S+@\S+$/.test(t.contactEmail.trim())
      ? undefined
      : 'An email address has an @ between two parts.',
  };
}

/** The request that the form makes. */
export function applicationBody(t: Readonly<Record<ApplicationField, string>>): CreateApplicationRequest {
  const capacity = t.capacityMw.trim();
  const phone = t.contactPhone.trim();
  return {
    title: t.title.trim(),
    connectionKind: t.connectionKind as CreateApplicationRequest['connectionKind'],
    capacityMw: capacity === '' ? null : Number(capacity),
    pointOfConnection: t.pointOfConnection.trim(),
    contact: {
      name: t.contactName.trim(),
      email: t.contactEmail.trim(),
      phone: phone === '' ? null : phone,
    },
  };
}

/** The server's names of the fields, turned into the form's. */
export function formFaults(faults: Readonly<Record<string, string>>): Record<string, string> {
  const named: Record<string, ApplicationField> = {
    'contact.name': 'contactName',
    'contact.email': 'contactEmail',
    'contact.phone': 'contactPhone',
  };
  return Object.fromEntries(Object.entries(faults).map(([name, text]) => [named[name] ?? name, text]));
}
