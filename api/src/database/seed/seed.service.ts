import { Injectable } from '@nestjs/common';
import {
  compileCorrelation,
  compilePropertyEquation,
  runChecks,
  runPropertyChecks,
  type CheckReport,
  type CompiledCorrelation,
  type CompiledEquation,
  type CorrelationDefinition,
  type Problem,
  type PropertyEquationDefinition,
} from '@merestone/engine';
import { SYSTEM_ACTOR } from '../../common/actor.js';
import { DraftingService } from '../../correlations/drafting.service.js';
import { GeometriesService } from '../../geometries/geometries.service.js';
import { DEMO_PASSWORD } from '../../people/demo-people.js';
import { OfficeService } from '../../people/office.service.js';
import { PropertyEquationsService } from '../../property-equations/property-equations.service.js';
import { PropertyLibraryService } from '../../property-equations/property-library.service.js';
import { ApprovalService } from '../../reviews/approval.service.js';
import { LifeNoticesService } from '../../reviews/life-notices.service.js';
import { ReviewingService } from '../../reviews/reviewing.service.js';
import { SubmissionService } from '../../reviews/submission.service.js';
import type { RevisionKey, RevisionRecord } from '../../revisions/revision-record.js';
import { changed, type DemoLife } from './demo-life.js';
import { DemoLifeService } from './demo-life.service.js';
import { DemoOffice } from './demo-office.js';
import { DemoStaffService } from './demo-staff.service.js';
import { DEMO_MEANING, DEMO_REVIEW_NOTE, EVERYTHING_CHECKED } from './demo-words.js';
import { FixtureFiles, type Exceptions, type Named } from './fixture-files.js';
import { correlationStanding, propertyEquationStanding, type StartingStanding } from './standing-rule.js';

/** Fills a new database, through the services that people use, so that the journal tells how everything came to be. */
@Injectable()
export class SeedService {
  constructor(
    private readonly office: OfficeService,
    private readonly staff: DemoStaffService,
    private readonly geometries: GeometriesService,
    private readonly equations: PropertyEquationsService,
    private readonly drafting: DraftingService,
    private readonly libraries: PropertyLibraryService,
    private readonly submissions: SubmissionService,
    private readonly reviewing: ReviewingService,
    private readonly approvals: ApprovalService,
    private readonly notices: LifeNoticesService,
    private readonly demoLife: DemoLifeService,
  ) {}

  /**
   * Sets the office up unless that was done before: a demo office, or an empty one with the library as drafts; without
   * files there is nothing in it, so that a register can be brought in.
   */
  async fill(demo: boolean, files: FixtureFiles | null = new FixtureFiles()): Promise<void> {
    if (this.office.isFounded()) return;
    if (files !== null) {
      this.geometries.add(SYSTEM_ACTOR, files.geometries());
      if (demo) await this.fillDemo(files);
      else this.bringDrafts(files);
    }
    this.office.found(demo);
  }

  /** The library as drafts of nobody: whoever takes one up becomes its originator. */
  private bringDrafts(files: FixtureFiles): void {
    const note = 'Came with the library; to be checked against its sources.';
    for (const { slug, definition } of files.propertyEquations()) {
      this.equations.draft(SYSTEM_ACTOR, slug, definition, note);
    }
    for (const { slug, definition } of files.correlations()) {
      compiledOf(slug, compileCorrelation(definition));
      this.drafting.create(SYSTEM_ACTOR, slug, definition, note);
    }
  }

  private async fillDemo(files: FixtureFiles): Promise<void> {
    const office = new DemoOffice(await this.staff.bring(files));
    const life = files.demoLife();
    await this.notices.without(() => this.bringLibrary(office, files, life));
    const library = files.correlations();
    for (const { slug, acts } of life.life) {
      const n = library.findIndex((named) => named.slug === slug);
      const named = library[n];
      if (named === undefined) throw new Error(`The demo speaks of ${slug}, which is not in the library.`);
      await this.demoLife.live({ slug, team: office.team(n), library: named.definition }, acts);
    }
    this.demoLife.propose(life.appointment, office.administrator);
  }

  private async bringLibrary(office: DemoOffice, files: FixtureFiles, life: DemoLife): Promise<void> {
    const exceptions = files.exceptions();
    for (const [n, named] of files.propertyEquations().entries()) {
      await this.bringEquation(office, n, named, exceptions.propertyEquations);
    }
    for (const [n, { slug, definition }] of files.correlations().entries()) {
      const first = changed(definition, life.firstRevisions[slug] ?? []);
      await this.bringCorrelation(office, n, { slug, definition: first }, exceptions.correlations);
    }
  }

  private async bringEquation(
    office: DemoOffice,
    n: number,
    { slug, definition }: Named<PropertyEquationDefinition>,
    exceptions: Exceptions,
  ): Promise<void> {
    const compiled: CompiledEquation = compiledOf(slug, compilePropertyEquation(slug, definition));
    const failing = runPropertyChecks(compiled).filter(({ passed }) => !passed);
    const start = exceptions[slug] ?? startOf(failing, propertyEquationStanding(definition));
    const { originator } = office.team(n);
    const record = this.equations.draft(originator, slug, definition, noteOfDraft(start));
    await this.putForward(office, n, record, start);
  }

  private async bringCorrelation(
    office: DemoOffice,
    n: number,
    { slug, definition }: Named<CorrelationDefinition>,
    exceptions: Exceptions,
  ): Promise<void> {
    const compiled: CompiledCorrelation = compiledOf(slug, compileCorrelation(definition));
    const { library } = this.libraries.approvedOrLatest();
    const failing = runChecks(compiled, library).filter(({ passed }) => !passed);
    const start = exceptions[slug] ?? startOf(failing, correlationStanding(definition));
    const { originator } = office.team(n);
    const record = this.drafting.create(originator, slug, definition, noteOfDraft(start));
    await this.putForward(office, n, record, start);
  }

  /** Takes a draft as far as it goes: into review, and on to approval. */
  private async putForward(
    office: DemoOffice,
    n: number,
    record: RevisionRecord,
    start: StartingStanding,
  ): Promise<void> {
    if (start.standing === 'draft') return;
    const { originator, reviewers, authority } = office.team(n);
    const key: RevisionKey = record;
    const note = start.standing === 'in review' ? start.reason : undefined;
    this.submissions.submit(originator, key, { reviewers: reviewers.map(({ id }) => id), note });
    if (start.standing === 'in review') return;
    for (const reviewer of reviewers) {
      this.reviewing.review(reviewer, key, {
        verdict: 'recommend',
        checklist: EVERYTHING_CHECKED,
        note: DEMO_REVIEW_NOTE,
      });
    }
    await this.approvals.approve(authority, key, {
      password: DEMO_PASSWORD,
      meaning: DEMO_MEANING,
      hash: record.hash,
    });
  }
}

function startOf(failing: readonly CheckReport[], otherwise: StartingStanding): StartingStanding {
  if (failing.length === 0) return otherwise;
  const titles = failing.map(({ title }) => `"${title}"`).join(', ');
  return { standing: 'draft', reason: `Not all of its worked checks reproduce: ${titles}.` };
}

function noteOfDraft(start: StartingStanding): string | undefined {
  return start.standing === 'draft' ? start.reason : undefined;
}

function compiledOf<T>(
  slug: string,
  compilation: { ok: true; compiled: T } | { ok: false; problems: Problem[] },
): T {
  if (compilation.ok) return compilation.compiled;
  const faults = compilation.problems.map(({ field, message }) => `  ${field}: ${message}`);
  throw new Error([`The sheet ${slug} does not hold:`, ...faults].join('\n'));
}
