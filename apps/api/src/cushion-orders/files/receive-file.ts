import {
  type CallHandler,
  type ExecutionContext,
  Injectable,
  type NestInterceptor,
  PayloadTooLargeException,
} from '@nestjs/common';
import { FileInterceptor } from '@nestjs/platform-express';
import type { Request } from 'express';
import type { Observable } from 'rxjs';
import { Problem } from '../../common/problem';
import { LinkLimits } from '../link-limits';
import { FILE_LIMITS } from './clean-file';

/** What the upload brings, read into memory. */
export interface ReceivedFile {
  originalname: string;
  buffer: Buffer;
}

/** One file of a form, refused while it arrives once it is too large. */
const OneFile = FileInterceptor('file', {
  limits: { fileSize: FILE_LIMITS.bytes, files: 1, fields: 5, fieldSize: 1000, parts: 8 },
});

@Injectable()
export class ReceiveFile implements NestInterceptor {
  private readonly inner = new OneFile();

  async intercept(context: ExecutionContext, next: CallHandler): Promise<Observable<unknown>> {
    try {
      return (await this.inner.intercept(context, next)) as Observable<unknown>;
    } catch (fault) {
      if (fault instanceof PayloadTooLargeException) throw tooLarge();
      throw fault;
    }
  }
}

/** Asks for the link before anything is taken in. */
@Injectable()
export class LinkFirst implements NestInterceptor {
  constructor(private readonly limits: LinkLimits) {}

  async intercept(context: ExecutionContext, next: CallHandler): Promise<Observable<unknown>> {
    const request = context.switchToHttp().getRequest<Request<{ token: string }>>();
    await this.limits.bringing(request.params.token, request);
    return next.handle();
  }
}

function tooLarge(): Problem {
  const words = `The file is larger than ${FILE_LIMITS.bytesWords}.`;
  return new Problem(413, 'file-too-large', words, [{ path: 'file', code: 'too-large', message: words }]);
}
