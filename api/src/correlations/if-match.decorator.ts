import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import { ApiProblem } from '../common/problem.js';

const QUOTED_HASH = /^"([0-9a-f]{64})"$/;

/** The hash in the `If-Match` header, which names the content that the caller has before their eyes. */
export const IfMatch = createParamDecorator((_: unknown, context: ExecutionContext): string | undefined => {
  const header = context.switchToHttp().getRequest<Request>().headers['if-match'];
  if (header === undefined) return undefined;
  const hash = QUOTED_HASH.exec(header.trim())?.[1];
  if (hash !== undefined) return hash;
  throw ApiProblem.ofField('malformed', 'If-Match', 'It must be the hash of the content, in double quotes.');
});
