import { applyDecorators } from '@nestjs/common';
import { ApiConflictResponse, ApiCreatedResponse, ApiNotFoundResponse, ApiOperation } from '@nestjs/swagger';
import { Sheet } from '../correlations/dto/sheet.dto.js';

/** Describes an act in the life of a revision: each is answered with the sheet. */
export const Life = (operationId: string, summary: string) =>
  applyDecorators(
    ApiOperation({ operationId, summary }),
    ApiCreatedResponse({ type: Sheet, description: 'The sheet as it stands now' }),
    ApiNotFoundResponse({ description: 'There is no such revision that the caller may see' }),
    ApiConflictResponse({ description: "The revision's standing or content does not allow it" }),
  );
