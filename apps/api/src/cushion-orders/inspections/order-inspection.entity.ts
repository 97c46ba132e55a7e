import { Column, Entity, Index } from 'typeorm';
import { OfOrder } from '../entities/of-order';

export const INSPECTION_KINDS = ['first-article', 'received'] as const;
export type InspectionKind = (typeof INSPECTION_KINDS)[number];

export const INSPECTION_OUTCOMES = ['accepted', 'rejected'] as const;
export type InspectionOutcome = (typeof INSPECTION_OUTCOMES)[number];

export const MEASURED_SIZES = ['widthMm', 'depthMm', 'thicknessMm'] as const;
export type MeasuredSize = (typeof MEASURED_SIZES)[number];

/** One cushion on the sheet: asked and measured finished sizes; null was not measured. */
export interface InspectedCushion {
  mark: string;
  asked: Record<MeasuredSize, number>;
  measured: Record<MeasuredSize, number | null>;
  note: string;
}

/** The sheet that is filled in when a first article or the batch arrives. It keeps what was asked then. */
@Entity('order_inspections')
@Index(['orderId', 'at'])
export class OrderInspection extends OfOrder {
  @Column('text')
  kind: InspectionKind;

  @Column('text')
  revisionLetter: string;

  @Column('double precision')
  toleranceMm: number;

  @Column('jsonb')
  cushions: InspectedCushion[];

  @Column('text')
  outcome: InspectionOutcome;

  @Column('text')
  note: string;

  @Column('uuid', { array: true, default: () => "'{}'" })
  photoIds: string[];
}
