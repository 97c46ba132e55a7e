import { type CallHandler, type ExecutionContext, Injectable, type NestInterceptor } from '@nestjs/common';
import type { Response } from 'express';
import type { Observable } from 'rxjs';
import { NOT_LISTED } from '../common/web-app';

/** The address itself is the key: it is not passed on, listed or kept, whatever the answer is. */
@Injectable()
export class PrivatePage implements NestInterceptor {
  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    context.switchToHttp().getResponse<Response>().set({
      'Referrer-Policy': 'no-referrer',
      'X-Robots-Tag': NOT_LISTED,
      'Cache-Control': 'no-store',
    });
    return next.handle();
  }
}
