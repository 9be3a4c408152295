import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Transform, Type, type TransformFnParams } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayUnique,
  IsArray,
  IsBoolean,
  IsIn,
  IsInt,
  IsObject,
  IsOptional,
  IsString,
  Matches,
  Max,
  MaxLength,
  Min,
  MinLength,
  ValidateNested,
} from 'class-validator';
import { WITHDRAWAL_CLASSES, type WithdrawalClass } from '../../common/standing.js';
import { VERDICTS, type Checklist, type Verdict } from '../../common/verdict.js';
import { IsDayOrMoment } from './is-day-or-moment.js';

const SHORTEST_REASON = 10;
const LONGEST_TEXT = 4000;

function trimmed({ value }: TransformFnParams): unknown {
  return typeof value === 'string' ? value.trim() : value;
}

export class SubmissionBody {
  @ApiPropertyOptional({ type: [String], description: 'People asked to review it, by id' })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(10)
  @ArrayUnique()
  @IsString({ each: true })
  @MaxLength(60, { each: true })
  readonly reviewers?: string[];

  @ApiPropertyOptional({
    type: String,
    maxLength: LONGEST_TEXT,
    description: 'What the reviewers should know',
  })
  @IsOptional()
  @Transform(trimmed)
  @IsString()
  @MaxLength(LONGEST_TEXT)
  readonly note?: string;
}

export class ChecklistDto implements Checklist {
  @ApiProperty({ type: Boolean, description: 'The expression is that of the source' })
  @IsBoolean()
  readonly expression!: boolean;

  @ApiProperty({ type: Boolean, description: 'Every symbol is defined as in the source' })
  @IsBoolean()
  readonly definitions!: boolean;

  @ApiProperty({ type: Boolean, description: 'The ranges are those of the source' })
  @IsBoolean()
  readonly ranges!: boolean;

  @ApiProperty({ type: Boolean, description: 'The basis of each bound and of the coefficient is right' })
  @IsBoolean()
  readonly basis!: boolean;

  @ApiProperty({ type: Boolean, description: 'A worked check was recalculated by other means' })
  @IsBoolean()
  readonly recalculated!: boolean;

  @ApiProperty({ type: Boolean, description: 'The register has no second sheet of the same equation' })
  @IsBoolean()
  readonly duplicates!: boolean;
}

export class ReviewBody {
  @ApiProperty({ enum: VERDICTS })
  @IsIn(VERDICTS)
  readonly verdict!: Verdict;

  @ApiProperty({ type: ChecklistDto })
  @IsObject()
  @ValidateNested()
  @Type(() => ChecklistDto)
  readonly checklist!: ChecklistDto;

  @ApiPropertyOptional({
    type: String,
    maxLength: LONGEST_TEXT,
    description: 'Needed where the verdict is not to recommend',
  })
  @IsOptional()
  @Transform(trimmed)
  @IsString()
  @MaxLength(LONGEST_TEXT)
  readonly note?: string;
}

export class CommentBody {
  @ApiProperty({
    type: String,
    maxLength: 200,
    description: 'Path in the definition, such as `bounds[0]`; empty: the whole',
  })
  @IsString()
  @MaxLength(200)
  readonly field!: string;

  @ApiProperty({ type: String, minLength: 1, maxLength: LONGEST_TEXT })
  @Transform(trimmed)
  @IsString()
  @MinLength(1)
  @MaxLength(LONGEST_TEXT)
  readonly text!: string;
}

export class TextBody {
  @ApiProperty({ type: String, minLength: 1, maxLength: LONGEST_TEXT })
  @Transform(trimmed)
  @IsString()
  @MinLength(1)
  @MaxLength(LONGEST_TEXT)
  readonly text!: string;
}

export class NoteBody {
  @ApiPropertyOptional({ type: String, maxLength: LONGEST_TEXT, description: 'What was done about it' })
  @IsOptional()
  @Transform(trimmed)
  @IsString()
  @MaxLength(LONGEST_TEXT)
  readonly note?: string;
}

export class ApprovalBody {
  @ApiProperty({ type: String, description: "The caller's own password, once more", format: 'password' })
  @IsString()
  @MinLength(1)
  @MaxLength(1024)
  readonly password!: string;

  @ApiProperty({ type: String, minLength: 3, maxLength: 300, description: 'What the signature means' })
  @Transform(trimmed)
  @IsString()
  @MinLength(3)
  @MaxLength(300)
  readonly meaning!: string;

  @ApiProperty({ type: String, description: 'Hash of the content that is signed' })
  @IsString()
  @Matches(/^[0-9a-f]{64}$/, { message: 'must be the hash of the content, 64 hexadecimal digits' })
  readonly hash!: string;

  @ApiPropertyOptional({ type: String, maxLength: LONGEST_TEXT })
  @IsOptional()
  @Transform(trimmed)
  @IsString()
  @MaxLength(LONGEST_TEXT)
  readonly note?: string;

  @ApiPropertyOptional({
    type: String,
    description: 'From when on it holds: a day (from midnight UTC) or a moment; at once without it',
    example: '2027-01-31',
  })
  @IsOptional()
  @IsDayOrMoment()
  readonly effectiveFrom?: string;

  @ApiPropertyOptional({
    type: String,
    description: "When it is to be looked at again; after the office's number of months without it",
    example: '2030-01-31',
  })
  @IsOptional()
  @IsDayOrMoment()
  readonly reviewDue?: string;
}

export class ReasonBody {
  @ApiProperty({ type: String, minLength: SHORTEST_REASON, maxLength: LONGEST_TEXT })
  @Transform(trimmed)
  @IsString()
  @MinLength(SHORTEST_REASON)
  @MaxLength(LONGEST_TEXT)
  readonly reason!: string;
}

export class SuspensionBody extends ReasonBody {
  @ApiPropertyOptional({ type: Number, description: 'The open problem report that is being looked into' })
  @IsOptional()
  @IsInt()
  @Min(1)
  @Max(Number.MAX_SAFE_INTEGER)
  readonly problemReport?: number;
}

export class WithdrawalBody extends ReasonBody {
  @ApiProperty({ enum: WITHDRAWAL_CLASSES })
  @IsIn(WITHDRAWAL_CLASSES)
  readonly class!: WithdrawalClass;

  @ApiPropertyOptional({ type: String, maxLength: 80, description: 'Slug of the correlation to turn to' })
  @IsOptional()
  @IsString()
  @MaxLength(80)
  readonly successor?: string;
}
