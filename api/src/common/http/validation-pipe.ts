import { ValidationPipe } from '@nestjs/common';
import type { ValidationError } from 'class-validator';
import { ApiProblem, type FieldProblem } from '../problem.js';

/** Checks what came in against the route's DTO. Every field that fails is named with its path. */
export function validationPipe(): ValidationPipe {
  return new ValidationPipe({
    whitelist: true,
    forbidNonWhitelisted: true,
    transform: true,
    exceptionFactory: (errors) => problemFrom(errors),
  });
}

function problemFrom(errors: readonly ValidationError[]): ApiProblem {
  const fields = errors.flatMap((error) => fieldsOf(error, ''));
  const missing = fields.length > 0 && fields.every(({ code }) => code === 'missing');
  const detail =
    fields.length === 1 ? 'One field cannot be used.' : `${fields.length} fields cannot be used.`;
  return new ApiProblem(missing ? 'missing' : 'malformed', detail, { fields });
}

function fieldsOf(error: ValidationError, parent: string): FieldProblem[] {
  const field = parent === '' ? error.property : `${parent}.${error.property}`;
  const constraints = Object.entries(error.constraints ?? {});
  const inner = (error.children ?? []).flatMap((child) => fieldsOf(child, field));
  if (constraints.length === 0) return inner;
  if (constraints.some(([name]) => name === 'whitelistValidation')) {
    return [{ field, code: 'unknown-field', message: 'There is no such field here.' }, ...inner];
  }
  const message = constraints.map(([, text]) => text).join('; ');
  const code = error.value === undefined ? 'missing' : 'malformed';
  return [{ field, code, message }, ...inner];
}
