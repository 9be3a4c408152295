import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform, type TransformFnParams } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayUnique,
  IsArray,
  IsEmail,
  IsIn,
  IsString,
  Matches,
  MaxLength,
  MinLength,
  ValidateIf,
} from 'class-validator';
import { ROLES } from '../../common/roles.js';

const LONGEST_NAME = 100;
// The longest that SMTP can carry: RFC 5321, 4.5.3.1.3.
const LONGEST_ADDRESS = 254;
const LONGEST_REASON = 4000;
const SHORTEST_REASON = 10;

function trimmed({ value }: TransformFnParams): unknown {
  return typeof value === 'string' ? value.trim() : value;
}

interface Presence {
  readonly optional: boolean;
}
const ASKED: Presence = { optional: false };

/** A field may be left out; given as null it is not left out. */
const presence = ({ optional }: Presence) =>
  optional ? [ValidateIf((_: object, value: unknown) => value !== undefined)] : [];

/** A person's name: one line, without characters that cannot be seen or that turn the writing round. */
export const PersonName = ({ optional } = ASKED) =>
  applyDecorators(
    ...presence({ optional }),
    ApiProperty({ type: String, required: !optional, minLength: 1, maxLength: LONGEST_NAME }),
    Transform(trimmed),
    IsString(),
    MinLength(1),
    MaxLength(LONGEST_NAME),
    Matches(/^[^\p{C}\p{Zl}\p{Zp}]*$/u, { message: 'a name is one line of letters that can be seen' }),
  );

/** One plain address, never a list, a display name or anything with a line break. */
export const EmailAddress = ({ optional } = ASKED) =>
  applyDecorators(
    ...presence({ optional }),
    ApiProperty({ type: String, required: !optional, format: 'email', maxLength: LONGEST_ADDRESS }),
    Transform(trimmed),
    IsString(),
    MaxLength(LONGEST_ADDRESS),
    IsEmail(
      { allow_utf8_local_part: false },
      { message: 'this is not an address such as name@office.example' },
    ),
    Matches(/^[^\s"(),:;<>[\\\]@]+@[A-Za-z0-9.-]+$/, {
      message: 'this is not an address such as name@office.example',
    }),
  );

export const RoleList = ({ optional } = ASKED) =>
  applyDecorators(
    ...presence({ optional }),
    ApiProperty({ enum: ROLES, isArray: true, required: !optional }),
    IsArray(),
    ArrayMaxSize(ROLES.length),
    ArrayUnique(),
    IsIn(ROLES, { each: true, message: `each must be one of ${ROLES.join(', ')}` }),
  );

/** A password as typed; whether it can be taken is for the password rules to say. */
export const Password = (description?: string) =>
  applyDecorators(
    ApiProperty({ type: String, format: 'password', ...(description === undefined ? {} : { description }) }),
    IsString(),
    MinLength(1),
    MaxLength(1024),
  );

/** Why something is done, for the record. */
export const Reason = () =>
  applyDecorators(
    ApiProperty({ type: String, minLength: SHORTEST_REASON, maxLength: LONGEST_REASON }),
    Transform(trimmed),
    IsString(),
    MinLength(SHORTEST_REASON),
    MaxLength(LONGEST_REASON),
  );
