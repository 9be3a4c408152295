import type { IncomingMessage } from 'node:http';
import type { NextFunction, Request, Response } from 'express';
import { ApiProblem } from '../problem.js';
import { findDuplicateKey } from './find-duplicate-key.js';
import { inspectJson } from './inspect-json.js';

export const BODY_LIMIT_BYTES = 1024 * 1024;

/** Multipart bodies are read by the routes that take files. */
export function isReadHere(request: IncomingMessage): boolean {
  return !mediaType(request).startsWith('multipart/');
}

function mediaType(request: IncomingMessage): string {
  return (request.headers['content-type'] ?? '').split(';')[0]?.trim().toLowerCase() ?? '';
}

/** Turns the raw body into an object, or refuses it with a reason. Comes after the raw body parser. */
export function readJsonBody(request: Request, _response: Response, next: NextFunction): void {
  const raw: unknown = request.body;
  if (Buffer.isBuffer(raw)) request.body = raw.length === 0 ? undefined : parseBody(request, raw);
  refuseBadQuery(request.query);
  next();
}

function parseBody(request: IncomingMessage, raw: Buffer): object {
  if (mediaType(request) !== 'application/json') {
    throw new ApiProblem('unsupported-media-type', 'Send the body as application/json.');
  }
  return readJsonObject(raw);
}

/** The object that some bytes say as JSON; refused with a reason where they say none that can be used. */
export function readJsonObject(raw: Buffer): object {
  const text = decode(raw);
  const value = parseJson(text);
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    throw new ApiProblem('malformed', 'The body must be a JSON object.');
  }
  const fields = inspectJson(value);
  if (fields.length > 0) throw new ApiProblem('malformed', 'Some of the body cannot be used.', { fields });
  const duplicate = findDuplicateKey(text);
  if (duplicate !== undefined) throw ApiProblem.ofField('malformed', duplicate, 'This was given twice.');
  return value;
}

function decode(raw: Buffer): string {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(raw);
  } catch {
    throw new ApiProblem('malformed', 'The body is not UTF-8 text.');
  }
}

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch (error) {
    const log = error instanceof Error ? error.message : undefined;
    throw new ApiProblem('malformed', 'The body is not valid JSON.', { log });
  }
}

function refuseBadQuery(query: Request['query']): void {
  const fields = inspectJson(query);
  if (fields.length > 0) throw new ApiProblem('malformed', 'Some of the query cannot be used.', { fields });
}
