import { Injectable, type CallHandler, type ExecutionContext, type NestInterceptor } from '@nestjs/common';
import type { Response } from 'express';
import { map, type Observable } from 'rxjs';
import type { Sheet } from './dto/sheet.dto.js';

/** Names the content of a sheet in the `ETag` header, for the `If-Match` of an edit. */
@Injectable()
export class SheetEtag implements NestInterceptor<Sheet, Sheet> {
  intercept(context: ExecutionContext, next: CallHandler<Sheet>): Observable<Sheet> {
    const response = context.switchToHttp().getResponse<Response>();
    return next.handle().pipe(
      map((answer) => {
        response.setHeader('ETag', `"${answer.hash}"`);
        return answer;
      }),
    );
  }
}
