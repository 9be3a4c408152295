import type { components } from '@merestone/api-client';
import type {
  CorrelationDefinition,
  Difference,
  Finding,
  InspectionReport,
  Outcome,
  PropertyEquationDefinition,
  Stretch,
} from '@merestone/engine';

/*
 * The server's answers under the names the screens use. They come from its contract; where that only repeats a type
 * of the engine (definitions, findings, outcomes), the engine's own stands in its place.
 */
type Schemas = components['schemas'];
type Replace<T, U> = Omit<T, keyof U> & U;

export type FieldProblem = Schemas['FieldProblemResponse'];
export type OtherSheet = Schemas['AlternativeResponse'];
export type ProblemBody = Replace<
  Partial<Schemas['ProblemResponse']>,
  { title: string; findings?: Finding[] }
>;

export type SessionAnswer = Schemas['SessionResponse'];
export type Permission = SessionAnswer['permissions'][number];
export type Role = SessionAnswer['person']['roles'][number];
export type PersonName = Schemas['NamedPerson'];
export type DemoPeople = Schemas['DemoPeopleResponse'];

export type Standing = Sheet['standing'];
export type Phase = CorrelationDefinition['phase'];

export type Geometry = Schemas['GeometryEntry'];

export type FacetCount = Schemas['FacetCount'];
export type ListedBound = Replace<Schemas['ListedBound'], { stretches: Stretch[] }>;
export type ListedCorrelation = Replace<Schemas['ListedCorrelation'], { bounds: ListedBound[] }>;
export type CorrelationPage = Replace<Schemas['CorrelationPage'], { items: ListedCorrelation[] }>;

export type CheckReport = Schemas['CheckReportDto'];
export type SheetEquation = Replace<Schemas['SheetEquation'], { definition: PropertyEquationDefinition }>;
export type Sheet = Replace<
  Schemas['Sheet'],
  { definition: CorrelationDefinition; equations: SheetEquation[] }
>;

export type Provenance = Schemas['ProvenanceDto'];
export type KeptEvaluation = Exclude<Outcome, { outcome: 'refused' }> &
  Pick<
    Schemas['WithinEvaluation'],
    'id' | 'at' | 'slug' | 'revision' | 'standing' | 'provenance' | 'caution'
  >;

export type ListedPropertyEquation = Schemas['ListedPropertyEquation'];
export type PropertyEquationSheet = Replace<
  Schemas['PropertyEquationSheet'],
  { definition: PropertyEquationDefinition }
>;

export type JournalEntry = Schemas['JournalItem'];
export type JournalPage = Schemas['JournalResponse'];
export type JournalVerification = Schemas['VerificationResponse'];

export type ListedPerson = Schemas['PersonEntry'];
export type ManagedPerson = Schemas['ManagedPerson'];
export type Invitation = Schemas['InvitationResponse'];
export type Appointment = Schemas['AppointmentItem'];
export type AppointmentProposal = Schemas['ProposalDto'];
export type Settings = Schemas['SettingsResponse'];
export type SettingsChange = Schemas['SettingsDto'];
export type Letter = Schemas['OutboxItem'];
export type OwnSession = Schemas['SessionItem'];
export type Notice = Schemas['NoticeItem'];
export type NoticePage = Schemas['NoticesResponse'];
export type NoticeKind = Notice['kind'];
export type MailChoices = Schemas['NoticeChoices']['mail'];
export type Attachment = Schemas['AttachmentItem'];
export type Attachments = Schemas['AttachmentsResponse'];
export type Licence = Attachment['licence'];

export type Desk = Schemas['Desk'];
export type DeskSection = Schemas['DeskSection'];
export type DeskItem = Schemas['DeskItem'];

export type Verdict = Schemas['ReviewVerdict'];
export type Checklist = Schemas['ChecklistDto'];
export type ReviewComment = Schemas['ReviewComment'];
export type Iteration = Replace<Schemas['ReviewIteration'], { differences: Difference[] }>;
export type Review = Replace<
  Schemas['ReviewPage'],
  { definition: CorrelationDefinition; inspection: InspectionReport | null; iterations: Iteration[] }
>;
export type Withdrawal = Schemas['SheetWithdrawal'];

export type Differences = Replace<
  Schemas['DifferencesResponse'],
  { differences: Difference[]; before: CorrelationDefinition; after: CorrelationDefinition }
>;

export type ProblemReport = Schemas['ProblemReport'];
export type ReportSeverity = ProblemReport['severity'];
export type ReportOutcome = Schemas['ProblemReportAnswer']['outcome'];
