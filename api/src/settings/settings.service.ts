import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { ApiProblem } from '../common/problem.js';
import type { Reader } from '../database/connection.js';
import { Writer } from '../database/write.js';
import type { JsonObject } from '../journal/entry.js';
import { PeopleService } from '../people/people.service.js';
import type { SettingsDto, SettingsResponse } from './dto/settings.dto.js';
import type { OfficeSettings } from './office-settings.js';
import { mayBePrincipal } from './settings.policy.js';
import { SettingsRepository } from './settings.repository.js';

const NAMES = ['officeName', 'reviewsNeeded', 'principalId', 'reviewDueMonths'] as const;

@Injectable()
export class SettingsService {
  constructor(
    private readonly settings: SettingsRepository,
    private readonly people: PeopleService,
    private readonly writer: Writer,
  ) {}

  /** The settings as they stand, for the other features' rules. */
  current(reader?: Reader): OfficeSettings {
    return this.settings.read(reader);
  }

  show(): SettingsResponse {
    const { principalId, ...others } = this.settings.read();
    const principal = principalId === null ? undefined : this.people.byId(principalId);
    return {
      ...others,
      principal: principal === undefined ? null : { id: principal.id, name: principal.name },
    };
  }

  /** Replaces all of them; the journal keeps what each was before. */
  change(actor: Actor, { principal, ...given }: SettingsDto): SettingsResponse {
    this.writer.write(actor, 'settings.changed', (tx) => {
      const before = this.settings.read(tx);
      const wanted: OfficeSettings = {
        officeName: given.officeName,
        reviewsNeeded: given.reviewsNeeded,
        reviewDueMonths: given.reviewDueMonths,
        principalId: principal,
      };
      if (principal !== null && principal !== before.principalId) this.assertPrincipal(principal);
      this.settings.write(tx, wanted);
      return { subject: 'settings', detail: differences(before, wanted), result: undefined };
    });
    return this.show();
  }

  private assertPrincipal(id: string): void {
    const decision = mayBePrincipal(this.people.activeActor(id));
    if (!decision.allowed) throw ApiProblem.ofField(decision.code, 'principal', decision.reason);
  }
}

function differences(before: OfficeSettings, after: OfficeSettings): JsonObject {
  const changed = NAMES.filter((name) => before[name] !== after[name]);
  return Object.fromEntries(changed.map((name) => [name, { from: before[name], to: after[name] }]));
}
