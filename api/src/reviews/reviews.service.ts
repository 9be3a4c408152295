import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import type { Sheet } from '../correlations/dto/sheet.dto.js';
import { SheetService } from '../correlations/sheet.service.js';
import type { RevisionPath } from '../revisions/revision-record.js';
import { ApprovalService, type Approval } from './approval.service.js';
import { CommentsService } from './comments.service.js';
import { ReviewingService, type Review } from './reviewing.service.js';
import { StandingService, type Suspension, type Withdrawal } from './standing.service.js';
import { SubmissionService, type Submission } from './submission.service.js';

/** The life of a correlation's revision; each act is answered with the sheet as it stands after it. */
@Injectable()
export class ReviewsService {
  constructor(
    private readonly submissions: SubmissionService,
    private readonly reviewing: ReviewingService,
    private readonly comments: CommentsService,
    private readonly approvals: ApprovalService,
    private readonly standings: StandingService,
    private readonly sheets: SheetService,
  ) {}

  submit(actor: Actor, path: RevisionPath, given: Submission): Sheet {
    this.submissions.submit(actor, keyOf(path), given);
    return this.sheet(actor, path);
  }

  putForward(actor: Actor, path: RevisionPath, note: string | undefined): Sheet {
    this.submissions.putForward(actor, keyOf(path), note);
    return this.sheet(actor, path);
  }

  take(actor: Actor, path: RevisionPath): Sheet {
    this.reviewing.take(actor, keyOf(path));
    return this.sheet(actor, path);
  }

  review(actor: Actor, path: RevisionPath, given: Review, ifMatch: string | undefined): Sheet {
    this.reviewing.review(actor, keyOf(path), given, ifMatch);
    return this.sheet(actor, path);
  }

  comment(actor: Actor, path: RevisionPath, field: string, text: string): Sheet {
    this.comments.comment(actor, keyOf(path), field, text);
    return this.sheet(actor, path);
  }

  answer(actor: Actor, path: RevisionPath, id: number, text: string): Sheet {
    this.comments.answer(actor, keyOf(path), id, text);
    return this.sheet(actor, path);
  }

  resolve(actor: Actor, path: RevisionPath, id: number): Sheet {
    this.comments.resolve(actor, keyOf(path), id);
    return this.sheet(actor, path);
  }

  async approve(actor: Actor, path: RevisionPath, given: Approval): Promise<Sheet> {
    await this.approvals.approve(actor, keyOf(path), given);
    return this.sheet(actor, path);
  }

  decline(actor: Actor, path: RevisionPath, reason: string): Sheet {
    this.approvals.decline(actor, keyOf(path), reason);
    return this.sheet(actor, path);
  }

  suspend(actor: Actor, path: RevisionPath, given: Suspension): Sheet {
    this.standings.suspend(actor, keyOf(path), given);
    return this.sheet(actor, path);
  }

  reinstate(actor: Actor, path: RevisionPath, reason: string): Sheet {
    this.standings.reinstate(actor, keyOf(path), reason);
    return this.sheet(actor, path);
  }

  withdraw(actor: Actor, path: RevisionPath, given: Withdrawal): Sheet {
    this.standings.withdraw(actor, keyOf(path), given);
    return this.sheet(actor, path);
  }

  private sheet(actor: Actor, { slug, number }: RevisionPath): Sheet {
    return this.sheets.revision(actor, slug, number);
  }
}

function keyOf({ slug, number }: RevisionPath) {
  return { kind: 'correlation' as const, slug, number };
}
