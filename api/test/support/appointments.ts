import { AppointmentsService, type Proposal } from '../../src/appointments/appointments.service.js';
import type { AppointmentItem } from '../../src/appointments/dto/appointments-response.dto.js';
import { SettingsService } from '../../src/settings/settings.service.js';
import type { TestApp } from './create-test-app.js';
import { TEST_PASSWORD, type SignedIn } from './people.js';

/** The day so many days from now, by the office's clock. */
export function dayIn({ clock }: TestApp, days: number): string {
  return new Date(clock.now().getTime() + days * 86_400_000).toISOString().slice(0, 10);
}

export function namePrincipal({ app }: TestApp, administrator: SignedIn, principal: SignedIn | null): void {
  app.get(SettingsService).change(administrator.actor, {
    officeName: 'Office for tests',
    reviewsNeeded: 2,
    principal: principal?.actor.id ?? null,
    reviewDueMonths: 36,
  });
}

/** Appoints a person through the services that people use. */
export async function appointed(
  test: TestApp,
  { proposer, confirmer }: { proposer: SignedIn; confirmer: SignedIn },
  person: string,
  overrides: Partial<Proposal> = {},
): Promise<AppointmentItem> {
  const service = test.app.get(AppointmentsService);
  const { id } = service.propose(proposer.actor, {
    person,
    geometries: 'all',
    until: dayIn(test, 365),
    ...overrides,
  });
  return service.confirm(confirmer.actor, id, TEST_PASSWORD);
}
