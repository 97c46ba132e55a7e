import { Column, Entity, Index } from 'typeorm';
import { OfOrder } from '../entities/of-order';

export const FILE_STATES = ['arriving', 'kept', 'leaving'] as const;
/** Only `kept` is shown. The others are on their way in or out of the store; a sweep ends them when nobody else does. */
export type FileState = (typeof FILE_STATES)[number];

export const FILE_TYPES = ['image/jpeg', 'application/pdf'] as const;
export type FileType = (typeof FILE_TYPES)[number];

/** A photograph or paper of an order. The bytes are in the object store under `objectKey`. */
@Entity('order_files')
@Index(['orderId', 'at'])
@Index(['state', 'at'])
export class OrderFile extends OfOrder {
  @Column({ type: 'text', nullable: true })
  cushionMark: string | null;

  @Column('text')
  name: string;

  @Column('text')
  type: FileType;

  @Column('integer')
  bytes: number;

  @Column({ type: 'integer', nullable: true })
  widthPx: number | null;

  @Column({ type: 'integer', nullable: true })
  heightPx: number | null;

  @Column('text', { unique: true })
  objectKey: string;

  @Column('text')
  state: FileState;
}
