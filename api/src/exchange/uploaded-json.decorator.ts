import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import { readJsonObject } from '../common/http/read-json-body.js';
import { ApiProblem } from '../common/problem.js';

/** The JSON object that was sent: as the body, or as the file of a multipart body. */
export const UploadedJson = createParamDecorator((_: unknown, context: ExecutionContext): object => {
  const request = context.switchToHttp().getRequest<Request & { file?: { buffer: Buffer } }>();
  if (request.file !== undefined) return readJsonObject(request.file.buffer);
  const body: unknown = request.body;
  const isMultipart = request.headers['content-type']?.startsWith('multipart/') === true;
  if (!isMultipart && typeof body === 'object' && body !== null && !Array.isArray(body)) return body;
  throw ApiProblem.ofField('missing', 'file', 'A file is needed.');
});
