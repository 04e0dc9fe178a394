/** What goes in and what comes out of the operations of people, sign-in, rules and the server itself. */
import type * as Api from './api.generated';

/** Query, body and answer by operationId. */
export interface AccountExchanges {
  getLive: { response: Api.Health };
  getReady: { response: Api.Health };
  getOpenApi: { response: unknown };
  getSession: { response: Api.Session };
  signIn: { body: Api.SignInRequest; response: Api.Session | Api.NextStep };
  signOut: { response: Api.Done };
  verifyTotp: { body: Api.VerifyTotpRequest; response: Api.Session };
  enrolTotp: { response: Api.TotpEnrolment };
  switchOrganisation: { body: Api.SwitchOrganisationRequest; response: Api.Session };
  changePassword: { body: Api.ChangePasswordRequest; response: Api.Session };
  askForReset: { body: Api.AskForResetRequest; response: Api.Done };
  resetPassword: { body: Api.ResetPasswordRequest; response: Api.Done };
  askForAccount: { body: Api.AskForAccountRequest; response: Api.Done };
  acceptInvitation: { body: Api.AcceptInvitationRequest; response: Api.Done };
  setUp: { body: Api.SetUpRequest; response: Api.Done };
  listPeople: { response: Api.PeopleList };
  setPersonStatus: { body: Api.SetPersonStatusRequest; response: Api.PeopleEntry };
  grantRole: { body: Api.GrantRoleRequest; response: Api.PeopleEntry };
  removeRole: { response: Api.PeopleEntry };
  barReviewer: { body: Api.BarReviewerRequest; response: Api.PeopleEntry };
  listOrganisations: { response: Api.OrganisationList };
  createOrganisation: { body: Api.CreateOrganisationRequest; response: Api.Organisation };
  listInvitations: { response: Api.InvitationList };
  invitePerson: { body: Api.InvitePersonRequest; response: Api.Invitation };
  approveInvitation: { body: Api.ApproveInvitationRequest; response: Api.Invitation };
  refuseInvitation: { body: Api.RefuseInvitationRequest; response: Api.Invitation };
  listAuditEvents: { query: Api.ListAuditEventsRequest; response: Api.AuditEventList };
  listRuleSets: { response: Api.RuleSetList };
  getBandDraft: { response: Api.BandDraft };
  saveBandDraft: { body: Api.SaveBandDraftRequest; response: Api.BandDraft };
  discardBandDraft: { query: Api.DiscardBandDraftRequest; response: Api.BandDraft };
  publishBands: { body: Api.PublishBandsRequest; response: Api.RuleSetSummary };
  getCalendar: { response: Api.Calendar };
  saveCalendar: { body: Api.SaveCalendarRequest; response: Api.Calendar };
  getMailRoom: { response: Api.MailRoom };
}
