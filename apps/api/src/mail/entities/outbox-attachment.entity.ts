import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { OutboxMail } from './outbox-mail.entity';

@Entity('outbox_attachments')
@Index(['mailId'])
export class OutboxAttachment {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  mailId: string;

  @ManyToOne(() => OutboxMail, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'mail_id' })
  mail: Relation<OutboxMail>;

  @Column('text')
  filename: string;

  @Column('text')
  contentType: string;

  /** Empty while it is to be drawn again: its mail waits. */
  @Column('bytea')
  content: Buffer;
}
