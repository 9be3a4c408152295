import { Injectable } from '@nestjs/common';
import { AppointmentsService } from '../appointments/appointments.service.js';
import type { Actor } from '../common/actor.js';
import { Clock } from '../common/clock.js';
import { hasPermission, type Permission } from '../common/permissions.js';
import type { RevisionRecord } from '../revisions/revision-record.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { SettingsService } from '../settings/settings.service.js';
import { appointmentItems } from './appointment-items.js';
import {
  commentItems,
  draftItems,
  dueItems,
  reportItems,
  toApproveItems,
  toReviewItems,
  toTakeItems,
  type OpenRevision,
} from './desk.mapper.js';
import { DeskReadModel } from './desk.read-model.js';
import type { Desk, DeskItem, DeskSection, DeskSectionKey } from './dto/desk.dto.js';

const DAYS_AHEAD = 30;
const DAY_MS = 24 * 3600_000;

interface Section {
  readonly key: DeskSectionKey;
  readonly title: string;
  readonly empty: string;
  /** Whoever holds one of these has the section; nobody needs one for an empty list. */
  readonly for: readonly Permission[];
  readonly items: (found: Found) => DeskItem[];
}

/** What the sections are put together from. */
interface Found {
  readonly actor: Actor;
  readonly now: string;
  readonly all: readonly RevisionRecord[];
  readonly open: readonly OpenRevision[];
}

/** The start page: what waits for the caller, by role. */
@Injectable()
export class DeskService {
  private readonly sections: readonly Section[] = [
    {
      key: 'drafts',
      title: 'My drafts',
      empty: 'No draft of yours waits. A new correlation starts as one.',
      for: ['correlation.draft'],
      items: ({ actor, open }) => draftItems(actor, open),
    },
    {
      key: 'to-review',
      title: 'To review',
      empty: 'No review waits for your verdict.',
      for: ['correlation.review'],
      items: ({ actor, open }) => toReviewItems(actor, open),
    },
    {
      key: 'open-comments',
      title: 'Open comments',
      empty: 'No comment waits for your word.',
      for: ['correlation.comment'],
      items: ({ actor, open }) => commentItems(actor, open),
    },
    {
      key: 'to-take',
      title: 'Reviews to take',
      empty: 'Every revision in review has its reviewers.',
      for: ['correlation.review'],
      items: ({ actor, open }) => toTakeItems(actor, open, this.settings.current().reviewsNeeded),
    },
    {
      key: 'to-approve',
      title: 'To approve',
      empty: 'Nothing that you may sign has all its reviews.',
      for: ['correlation.approve'],
      items: ({ actor, open, now }) =>
        toApproveItems(actor, open, ({ geometry }) =>
          this.appointments.approvalGround(actor.id, geometry, now),
        ),
    },
    {
      key: 'reports',
      title: 'Problems reported',
      empty: 'No problem report is open, and nothing is suspended.',
      for: ['problem-report.answer', 'correlation.draft'],
      items: ({ actor, all }) => this.reports(actor, all),
    },
    {
      key: 'due',
      title: 'Due for review',
      empty: `No review falls due in the next ${DAYS_AHEAD} days.`,
      for: ['correlation.approve', 'correlation.draft'],
      items: ({ actor, all, now }) => dueItems(actor, dueSoon(all, now), now),
    },
    {
      key: 'appointments',
      title: 'Appointments',
      empty: 'No appointment waits for you.',
      for: ['appointment.propose', 'correlation.approve'],
      items: ({ actor, now }) =>
        appointmentItems(actor, this.appointments.list(actor).items, inDays(now, DAYS_AHEAD)),
    },
    {
      key: 'notices',
      title: 'Notices',
      empty: 'You have read everything.',
      for: ['register.read'],
      items: ({ actor }) =>
        this.desk.unreadNotices(actor.id).map(({ text, href, at }) => ({ title: text, line: '', href, at })),
    },
  ];

  constructor(
    private readonly desk: DeskReadModel,
    private readonly revisions: RevisionsService,
    private readonly appointments: AppointmentsService,
    private readonly settings: SettingsService,
    private readonly clock: Clock,
  ) {}

  of(actor: Actor): Desk {
    const now = this.clock.now().toISOString();
    const all = this.revisions.ofCorrelations();
    const worked = all.filter(({ standing }) => standing === 'draft' || standing === 'in review');
    const progress = this.desk.progress(worked.map(({ id }) => id));
    const open = worked.flatMap((record): OpenRevision[] => {
      const come = progress.get(record.id);
      return come === undefined ? [] : [{ record, progress: come }];
    });
    const found: Found = { actor, now, all, open };
    return { sections: this.sections.flatMap((section) => sectionFor(section, found)) };
  }

  private reports(actor: Actor, all: readonly RevisionRecord[]): DeskItem[] {
    const titles = new Map(all.map(({ slug, title }) => [slug, title]));
    return reportItems(
      actor,
      this.desk.openReports(),
      all.filter(({ standing }) => standing === 'suspended'),
      (slug) => titles.get(slug) ?? slug,
    );
  }
}

/** The named principal of the office confirms appointments whatever their roles: for them that section is there too. */
function sectionFor(section: Section, found: Found): DeskSection[] {
  const { key, title, empty } = section;
  const has = section.for.some((permission) => hasPermission(found.actor.roles, permission));
  const items = has || key === 'appointments' ? section.items(found) : [];
  return has || items.length > 0 ? [{ key, title, empty, items }] : [];
}

function dueSoon(all: readonly RevisionRecord[], now: string): RevisionRecord[] {
  const until = inDays(now, DAYS_AHEAD);
  return all.filter(({ inForce, reviewDue }) => inForce && reviewDue !== null && reviewDue <= until);
}

function inDays(now: string, days: number): string {
  return new Date(new Date(now).getTime() + days * DAY_MS).toISOString();
}
