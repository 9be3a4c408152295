import { Catch, Logger, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import type { Request, Response } from 'express';
import { actorOf } from '../access/current-actor.decorator.js';
import { problemFrom, type ThrownProblem } from './problem-from.js';

/** Answers everything that was thrown as `application/problem+json`, and logs what somebody should look into. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger('Problem');

  catch(thrown: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const request = http.getRequest<Request>();
    const response = http.getResponse<Response>();
    const found = problemFrom(thrown);
    this.log(found, request);
    if (response.headersSent) {
      response.destroy();
      return;
    }
    const { retryAfterSeconds } = found.problem.extras;
    if (retryAfterSeconds !== undefined) response.setHeader('Retry-After', retryAfterSeconds);
    response
      .status(found.problem.status)
      .type('application/problem+json')
      .send(JSON.stringify(found.problem.toBody(found.instance)));
  }

  private log({ problem, instance }: ThrownProblem, request: Request): void {
    // As JSON, so that nothing a caller sent can look like a line of its own.
    const line = JSON.stringify({
      code: problem.code,
      actor: actorOf(request)?.id,
      method: request.method,
      path: request.path,
      address: request.ip,
      instance,
      log: problem.extras.log,
    });
    if (problem.status >= 500) this.logger.error(line);
    else if (problem.status === 401 || problem.status === 403 || problem.status === 429)
      this.logger.warn(line);
  }
}
