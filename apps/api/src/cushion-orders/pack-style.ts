import type { LengthStyle } from '@settlewright/geometry';
import type { Production } from '../productions/entities/production.entity';
import type { Paper, Workshop } from '../workshops/entities/workshop.entity';
import type { PackQuery } from './dto/pack-query.dto';
import type { CushionOrder } from './entities/cushion-order.entity';

interface PackStyle {
  paper: Paper;
  units: Pick<LengthStyle, 'system' | 'roundTo'>;
}

/** Paper and units of an order: what was asked for, else what its upholsterer prefers, else what the workshop uses. */
export function packStyle(
  { upholsterer }: Pick<CushionOrder, 'upholsterer'>,
  production: Pick<Production, 'units' | 'roundTo'>,
  workshop: Pick<Workshop, 'paper'>,
  wanted: PackQuery = {},
): PackStyle {
  return {
    paper: wanted.paper ?? upholsterer?.paper ?? workshop.paper,
    units: {
      system: wanted.units ?? upholsterer?.units ?? production.units,
      roundTo: wanted.roundTo ?? production.roundTo,
    },
  };
}
