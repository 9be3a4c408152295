import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { authorize, type Decision } from '../common/authorized.js';
import { Clock } from '../common/clock.js';
import { ApiProblem, type FieldProblem } from '../common/problem.js';
import type { Reader, Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { GeometriesService } from '../geometries/geometries.service.js';
import { NoticesService } from '../notices/notices.service.js';
import { PeopleService } from '../people/people.service.js';
import { SigningService } from '../people/signing.service.js';
import { SettingsService } from '../settings/settings.service.js';
import { appointmentItem } from './appointment.mapper.js';
import {
  coveredBy,
  mayBeProposed,
  mayConfirm,
  mayEnd,
  mayLastUntil,
  type Confirming,
} from './appointment.policy.js';
import { AppointmentRepository, type AppointmentRow } from './appointment.repository.js';
import type { AppointmentItem, AppointmentsResponse } from './dto/appointments-response.dto.js';

export interface Proposal {
  readonly person: string;
  readonly geometries: 'all' | readonly string[];
  readonly until: string;
}

const HREF = '/office/appointments';

/** Technical authorities are appointed by two people, for geometries and until a day. */
@Injectable()
export class AppointmentsService {
  constructor(
    private readonly appointments: AppointmentRepository,
    private readonly people: PeopleService,
    private readonly geometries: GeometriesService,
    private readonly settings: SettingsService,
    private readonly notices: NoticesService,
    private readonly signing: SigningService,
    private readonly writer: Writer,
    private readonly clock: Clock,
  ) {}

  /**
   * Whether somebody may sign approvals for a geometry at a moment; for property equations, which have none (null), an
   * appointment for all geometries is needed. Its end stops approvals to come and touches none that were given.
   */
  mayApproveFor(personId: string, geometry: string | null, at: string, reader?: Reader): boolean {
    return coveredBy(this.appointments.open(personId, reader), geometry, at);
  }

  /** What the rule on approvals asks of the office: how many reviews, and whether this person may sign here now. */
  approvalGround(personId: string, geometry: string | null, at: string, reader?: Reader) {
    const { reviewsNeeded } = this.settings.current(reader);
    return { reviewsNeeded, appointed: this.mayApproveFor(personId, geometry, at, reader) };
  }

  list(actor: Actor): AppointmentsResponse {
    return { items: this.appointments.all().map((row) => this.item(actor, row)) };
  }

  /** Throws at `person`, `geometries` or `until` for what cannot be proposed. */
  propose(actor: Actor, { person, geometries, until }: Proposal): AppointmentItem {
    return this.writer.write(actor, 'appointment.proposed', (tx, at) => {
      refuseAt('person', mayBeProposed(actor, this.people.activeActor(person)));
      refuseAt('until', mayLastUntil(until, at));
      if (geometries !== 'all') this.assertGeometries(geometries, tx);
      const id = randomUUID();
      const scope = geometries === 'all' ? null : [...geometries];
      this.appointments.insert(tx, { id, personId: person, geometries: scope, until }, actor, at);
      this.notices.tell(tx, at, this.confirmers(tx, at, [actor.id, person]), {
        kind: 'appointment',
        text: `${actor.name} proposes ${this.nameOf(person)} as technical authority; a second person has to confirm it.`,
        href: HREF,
      });
      const detail = { person, geometries: scope, until };
      return { subject: subjectOf(id), detail, result: this.item(actor, this.one(id, tx), tx) };
    });
  }

  /** The second person's signature: from then on the person holds the role and may approve within the scope. */
  async confirm(actor: Actor, id: string, password: string): Promise<AppointmentItem> {
    this.assertMayConfirm(actor, this.one(id));
    await this.signing.confirm(actor, password, { undone: 'nothing was confirmed' });
    return this.writer.write(actor, 'appointment.confirmed', (tx, at) => {
      const row = this.assertMayConfirm(actor, this.one(id, tx), tx);
      this.appointments.confirm(tx, row, actor, at);
      const person = this.people.byId(row.personId, tx);
      if (person !== undefined && !person.roles.includes('authority')) {
        this.people.setRoles(tx, person, [...person.roles, 'authority']);
      }
      this.notices.tell(tx, at, [row.personId, row.proposedById], {
        kind: 'appointment',
        text: `${actor.name} confirmed ${this.nameOf(row.personId)} as technical authority until ${row.until}.`,
        href: HREF,
      });
      const { personId, geometries, until } = row;
      const detail = { person: personId, geometries, until, proposedBy: row.proposedById };
      return { subject: subjectOf(id), detail, result: this.item(actor, this.one(id, tx), tx) };
    });
  }

  end(actor: Actor, id: string, reason: string): AppointmentItem {
    return this.writer.write(actor, 'appointment.ended', (tx, at) => {
      const found = this.one(id, tx);
      const row = authorize(found, mayEnd(found, at));
      this.appointments.end(tx, row, actor, at, reason);
      this.notices.tell(
        tx,
        at,
        [row.personId, row.proposedById].filter((one) => one !== actor.id),
        {
          kind: 'appointment',
          text: `${actor.name} ended the appointment of ${this.nameOf(row.personId)}: ${reason}`,
          href: HREF,
        },
      );
      const detail = { person: row.personId, reason };
      return { subject: subjectOf(id), detail, result: this.item(actor, this.one(id, tx), tx) };
    });
  }

  private assertMayConfirm(actor: Actor, row: AppointmentRow, reader?: Reader) {
    return authorize(row, mayConfirm(row, this.confirming(actor, row, reader)));
  }

  private confirming(actor: Actor, { personId }: AppointmentRow, reader?: Reader): Confirming {
    const at = this.clock.now().toISOString();
    return {
      actor,
      person: this.people.activeActor(personId),
      isAuthority: actor.roles.includes('authority') && this.holdsOne(actor.id, at, reader),
      isPrincipal: this.settings.current(reader).principalId === actor.id,
      at,
    };
  }

  /** Whether somebody is a technical authority now, for whatever geometries. */
  private holdsOne(personId: string, at: string, reader?: Reader): boolean {
    return this.appointments
      .open(personId, reader)
      .some((row) => coveredBy([row], row.geometries?.[0] ?? null, at));
  }

  /** Everybody who could confirm now, but for those who must not. */
  private confirmers(tx: Tx, at: string, without: readonly string[]): string[] {
    const { principalId } = this.settings.current(tx);
    const authorities = this.people.list('authority', tx).filter(({ id }) => this.holdsOne(id, at, tx));
    const ids = [...authorities.map(({ id }) => id), ...(principalId === null ? [] : [principalId])];
    return ids.filter((id) => !without.includes(id));
  }

  private assertGeometries(slugs: readonly string[], tx: Tx): void {
    const fields = slugs.flatMap((slug, i): FieldProblem[] =>
      this.geometries.find(slug, tx) === undefined
        ? [{ field: `geometries.${i}`, code: 'malformed', message: `There is no geometry "${slug}".` }]
        : [],
    );
    if (fields.length > 0)
      throw new ApiProblem('malformed', 'Some of the geometries are not there.', { fields });
  }

  private one(id: string, reader?: Reader): AppointmentRow {
    const row = this.appointments.find(id, reader);
    if (row === undefined) throw new ApiProblem('not-found', 'There is no such appointment.');
    return row;
  }

  private nameOf(personId: string): string {
    return this.people.byId(personId)?.name ?? 'somebody';
  }

  private item(actor: Actor, row: AppointmentRow, reader?: Reader): AppointmentItem {
    const confirming = this.confirming(actor, row, reader);
    return appointmentItem({ actor, row, personName: this.nameOf(row.personId), confirming });
  }
}

function refuseAt(field: string, decision: Decision): void {
  if (!decision.allowed) throw ApiProblem.ofField(decision.code, field, decision.reason);
}

function subjectOf(id: string): string {
  return `appointments/${id}`;
}
