import { type CallHandler, type ExecutionContext, Injectable, type NestInterceptor } from '@nestjs/common';
import type { Response } from 'express';
import { map, type Observable } from 'rxjs';

/** An answer of null leaves as JSON's null; otherwise it would leave as no text at all, which is no JSON. */
@Injectable()
export class NullAsJson implements NestInterceptor {
  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    return next.handle().pipe(
      map((answer: unknown) => {
        if (answer !== null) return answer;
        context.switchToHttp().getResponse<Response>().type('application/json');
        return 'null';
      }),
    );
  }
}
