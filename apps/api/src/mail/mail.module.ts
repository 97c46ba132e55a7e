import { Global, Module } from '@nestjs/common';
import { MailService } from './mail.service';
import { MailTransport } from './mail-transport';
import { OutboxWorker } from './outbox-worker';

@Global()
@Module({ providers: [MailService, MailTransport, OutboxWorker], exports: [MailService] })
export class MailModule {}
