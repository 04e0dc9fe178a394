/**
 * Pages of the client that the links of account mails lead to, each with its token behind the #.
 * The server writes them into its mails and the client's route table serves them: neither may go its own way.
 */
export const MAIL_PAGES = { invitation: '/invitation', passwordReset: '/password-reset' } as const;
