import { Injectable } from '@nestjs/common';
import type { CompiledEquation, PropertyLibrary } from '@merestone/engine';
import { UNAPPROVED, type Standing } from '../common/standing.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import type { RevisionRecord } from '../revisions/revision-record.js';
import { RevisionsService } from '../revisions/revisions.service.js';

/** What a sheet's property equations are taken from. */
export interface ShelvedLibrary {
  readonly library: PropertyLibrary;
  /** The revision behind an equation of the library. */
  readonly revisionOf: (slug: string) => RevisionRecord | undefined;
}

/**
 * The office's property equations for evaluations. Sheets in use get approved equations alone; a sheet that is still
 * worked on may be tried with the latest of what is not approved yet.
 */
@Injectable()
export class PropertyLibraryService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
  ) {}

  approved(): ShelvedLibrary {
    return this.shelve((all) => all.find(({ inForce }) => inForce));
  }

  approvedOrLatest(): ShelvedLibrary {
    return this.shelve(
      (all) =>
        all.find(({ inForce }) => inForce) ??
        all.filter(({ standing }) => standing === 'draft' || standing === 'in review').at(-1),
    );
  }

  /** What a sheet of this standing is evaluated with. */
  forStanding(standing: Standing): ShelvedLibrary {
    return UNAPPROVED.includes(standing) ? this.approvedOrLatest() : this.approved();
  }

  private shelve(
    choose: (revisions: readonly RevisionRecord[]) => RevisionRecord | undefined,
  ): ShelvedLibrary {
    const chosen = new Map<string, RevisionRecord | undefined>();
    const revisionOf = (slug: string): RevisionRecord | undefined => {
      if (!chosen.has(slug)) chosen.set(slug, choose(this.revisions.all('property-equation', slug)));
      return chosen.get(slug);
    };
    const library = (slug: string): CompiledEquation | undefined => {
      const record = revisionOf(slug);
      return record && this.definitions.equation(record);
    };
    return { library, revisionOf };
  }
}
