import { Global, Module } from '@nestjs/common';
import { RateLimits } from './rate-limits.service';

@Global()
@Module({ providers: [RateLimits], exports: [RateLimits] })
export class RateLimitsModule {}
