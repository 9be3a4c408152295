import { Injectable } from '@nestjs/common';
import type { CorrelationDefinition } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import { DraftingService } from './drafting.service.js';
import type { Sheet } from './dto/sheet.dto.js';
import { SheetService } from './sheet.service.js';

/** Drafting, answered with the sheet. */
@Injectable()
export class CorrelationsService {
  constructor(
    private readonly drafting: DraftingService,
    private readonly sheets: SheetService,
  ) {}

  create(actor: Actor, slug: string, definition: CorrelationDefinition): Sheet {
    const { number } = this.drafting.create(actor, slug, definition);
    return this.sheets.revision(actor, slug, number);
  }

  next(actor: Actor, slug: string, definition: CorrelationDefinition): Sheet {
    const { number } = this.drafting.next(actor, slug, definition);
    return this.sheets.revision(actor, slug, number);
  }

  edit(
    actor: Actor,
    slug: string,
    number: number,
    definition: CorrelationDefinition,
    ifMatch: string | undefined,
  ): Sheet {
    this.drafting.edit(actor, { kind: 'correlation', slug, number }, definition, ifMatch);
    return this.sheets.revision(actor, slug, number);
  }
}
