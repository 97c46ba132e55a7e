import { Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { RateLimits } from '../rate-limits/rate-limits.service';
import { LinkService } from './link.service';

/** How often somebody may come by a private link. */
@Injectable()
export class LinkLimits {
  constructor(
    private readonly links: LinkService,
    private readonly limits: RateLimits,
  ) {}

  reading(request: Request): Promise<void> {
    return this.limits.take('link-ip', request.ip ?? '');
  }

  /** By order and not by token: each mail brings a token of its own. */
  async answering(token: string, request: Request): Promise<void> {
    await this.reading(request);
    const { order } = await this.links.open(token);
    await this.limits.take('link-answer', order.id);
  }

  /** A file. */
  async bringing(token: string, request: Request): Promise<void> {
    await this.reading(request);
    const { order } = await this.links.open(token);
    await this.limits.take('link-file', order.id);
  }
}
