import type * as Api from '../../../shared/contracts/api.generated';

/** The demo's people, all invented. Printed at the start and shown on the sign-in page, in the demo only. */
export const DEMO_PASSWORD = 'level beam on a pivot';

export const GRID_OWNER = 'Northmoor Grid';

/** Organisations that apply to connect. */
export const APPLICANTS = ['Fellgate Renewables', 'Skerrow Power', 'Lintgarth Industries'] as const;

export interface DemoAccount {
  email: string;
  name: string;
  role: 'applicant' | 'reviewer' | 'administrator';
  organisations: readonly string[];
}

export const DEMO_ACCOUNTS: readonly DemoAccount[] = [
  {
    email: 'sandgate@fellgate.example',
    name: 'P. Sandgate',
    role: 'applicant',
    organisations: ['Fellgate Renewables'],
  },
  { email: 'holm@skerrow.example', name: 'I. Holm', role: 'applicant', organisations: ['Skerrow Power'] },
  {
    email: 'garth@lintgarth.example',
    name: 'A. Garth',
    role: 'applicant',
    organisations: ['Lintgarth Industries'],
  },
  {
    email: 'aske@askeline.example',
    name: 'R. Aske',
    role: 'applicant',
    organisations: ['Skerrow Power', 'Lintgarth Industries'],
  },
  {
    email: 'thornholt@northmoor.example',
    name: 'M. Thornholt',
    role: 'reviewer',
    organisations: [GRID_OWNER],
  },
  { email: 'larkspur@northmoor.example', name: 'E. Larkspur', role: 'reviewer', organisations: [GRID_OWNER] },
  { email: 'varley@northmoor.example', name: 'T. Varley', role: 'reviewer', organisations: [GRID_OWNER] },
  { email: 'moss@northmoor.example', name: 'D. Moss', role: 'administrator', organisations: [GRID_OWNER] },
];

/** The accounts as the sign-in page shows them. */
export function demoAccounts(): Api.DemoAccount[] {
  return DEMO_ACCOUNTS.map(({ email, name, role, organisations }) => ({
    email,
    password: DEMO_PASSWORD,
    name,
    role,
    organisation: organisations.join(', '),
  }));
}
