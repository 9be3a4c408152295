import { Injectable } from '@nestjs/common';
import { AppointmentsService } from '../../appointments/appointments.service.js';
import { SYSTEM_ACTOR, type Actor } from '../../common/actor.js';
import { Clock } from '../../common/clock.js';
import { DEMO_PASSWORD } from '../../people/demo-people.js';
import { PeopleService } from '../../people/people.service.js';
import { DEFAULT_SETTINGS } from '../../settings/office-settings.js';
import { SettingsService } from '../../settings/settings.service.js';
import type { DemoPerson, FixtureFiles } from './fixture-files.js';

const YEARS = 3;

/** Brings in the people of the demo office, and has its technical authorities appointed as any office must. */
@Injectable()
export class DemoStaffService {
  constructor(
    private readonly people: PeopleService,
    private readonly settings: SettingsService,
    private readonly appointments: AppointmentsService,
    private readonly clock: Clock,
  ) {}

  /** Everybody, with the roles they hold in the end. */
  async bring(files: FixtureFiles): Promise<Actor[]> {
    const staff = files.people();
    for (const { name, email, roles } of staff) {
      const given = roles.filter((role) => role !== 'authority');
      await this.people.add(SYSTEM_ACTOR, { name, email, password: DEMO_PASSWORD, roles: given });
    }
    await this.appoint(staff, files.office());
    return staff.map(({ email }) => this.actor(email));
  }

  /** The principal confirms the first technical authority; from then on that one confirms the others. */
  private async appoint(
    staff: readonly DemoPerson[],
    office: { name: string; principal: string },
  ): Promise<void> {
    const administrator = this.actor(only(staff, 'administrator')[0] ?? '');
    const { reviewsNeeded, reviewDueMonths } = DEFAULT_SETTINGS;
    this.settings.change(administrator, {
      officeName: office.name,
      principal: this.actor(office.principal).id,
      reviewsNeeded,
      reviewDueMonths,
    });
    const [first, ...others] = only(staff, 'authority');
    if (first === undefined) throw new Error('A demo office needs a technical authority.');
    await this.appointOne(administrator, first, office.principal);
    for (const email of others) await this.appointOne(administrator, email, first);
  }

  private async appointOne(administrator: Actor, email: string, confirmer: string): Promise<void> {
    const { id } = this.appointments.propose(administrator, {
      person: this.actor(email).id,
      geometries: 'all',
      until: this.inYears(YEARS),
    });
    await this.appointments.confirm(this.actor(confirmer), id, DEMO_PASSWORD);
  }

  private inYears(years: number): string {
    const day = this.clock.now();
    day.setUTCFullYear(day.getUTCFullYear() + years);
    return day.toISOString().slice(0, 10);
  }

  private actor(email: string): Actor {
    const person = this.people.byEmail(email);
    const actor = person && this.people.activeActor(person.id);
    if (actor === undefined) throw new Error(`There is nobody with the address ${email} in the demo office.`);
    return actor;
  }
}

function only(staff: readonly DemoPerson[], role: DemoPerson['roles'][number]): string[] {
  return staff.filter(({ roles }) => roles.includes(role)).map(({ email }) => email);
}
