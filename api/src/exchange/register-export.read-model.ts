import { Injectable } from '@nestjs/common';
import { asc } from 'drizzle-orm';
import { Connection } from '../database/connection.js';
import { geometry } from '../database/schema/geometry.js';
import { problemReport, problemReportAnswer } from '../database/schema/problem-report.js';
import { correlation, propertyEquation } from '../database/schema/register-entry.js';
import {
  approval,
  comment,
  commentAnswer,
  commentResolution,
  review,
  reviewAssignment,
  submission,
} from '../database/schema/review.js';
import { revision, revisionContent, standingEvent } from '../database/schema/revision.js';

/** Every row of the register, each table in the order in which it was written. */
export type RegisterRows = ReturnType<RegisterExportReadModel['rows']>;

@Injectable()
export class RegisterExportReadModel {
  constructor(private readonly connection: Connection) {}

  rows() {
    const { reader } = this.connection;
    return {
      geometries: reader.select().from(geometry).orderBy(asc(geometry.slug)).all(),
      correlations: reader.select().from(correlation).orderBy(asc(correlation.slug)).all(),
      propertyEquations: reader.select().from(propertyEquation).orderBy(asc(propertyEquation.slug)).all(),
      revisions: reader.select().from(revision).orderBy(asc(revision.number)).all(),
      contents: reader.select().from(revisionContent).orderBy(asc(revisionContent.iteration)).all(),
      standings: reader.select().from(standingEvent).orderBy(asc(standingEvent.id)).all(),
      submissions: reader.select().from(submission).orderBy(asc(submission.id)).all(),
      assignments: reader.select().from(reviewAssignment).orderBy(asc(reviewAssignment.id)).all(),
      reviews: reader.select().from(review).orderBy(asc(review.id)).all(),
      comments: reader.select().from(comment).orderBy(asc(comment.id)).all(),
      answers: reader.select().from(commentAnswer).orderBy(asc(commentAnswer.id)).all(),
      resolutions: reader.select().from(commentResolution).orderBy(asc(commentResolution.id)).all(),
      approvals: reader.select().from(approval).orderBy(asc(approval.id)).all(),
      reports: reader.select().from(problemReport).orderBy(asc(problemReport.id)).all(),
      reportAnswers: reader.select().from(problemReportAnswer).orderBy(asc(problemReportAnswer.id)).all(),
    };
  }
}
