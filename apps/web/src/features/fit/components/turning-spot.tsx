import { planOf, type SetDocument, type Spot } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { roundSpot } from '../asked.ts';
import { useFitView } from '../fit-view.ts';
import { SpotFields } from './spot-fields.tsx';

interface TurningSpotProps {
  document: SetDocument;
  onSay: (spot: Spot | undefined, doing: string) => void;
}

/** Where a wheelchair user turns round: the middle of that space. */
export function TurningSpot({ document, onSay }: TurningSpotProps) {
  const { style } = useFitView();
  const { turningAt } = document.asked;
  if (turningAt === undefined) {
    const { x, y, width, height } = planOf(document).boundsMm;
    const middle = roundSpot({ xMm: x + width / 2, zMm: y + height / 2 }, style);
    return (
      <Button size="small" onClick={() => onSay(middle, 'Turning space marked')}>
        Mark a spot
      </Button>
    );
  }
  return (
    <>
      <SpotFields of="Middle" spot={turningAt} onSay={(spot) => onSay(spot, 'Turning space moved')} />
      <Button size="small" className="mt-3" onClick={() => onSay(undefined, 'Turning space taken away')}>
        Take the spot away
      </Button>
    </>
  );
}
