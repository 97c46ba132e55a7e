import type { SetDocument } from '@settlewright/geometry';
import { Disclosure } from '@/components/disclosure.tsx';
import { Select } from '@/components/select.tsx';
import { without } from '../asked.ts';
import { useFitView } from '../fit-view.ts';
import { AskedFloor } from './asked-floor.tsx';
import { SaidLength } from './said-length.tsx';

type Asked = SetDocument['asked'];

const POSTURES = [
  { value: 'dining', words: 'sitting up to eat' },
  { value: 'lounge', words: 'leaning back' },
] as const;
const TRAFFIC = [
  { value: 'none', words: 'nobody' },
  { value: 'edge-past', words: 'people edging past' },
  { value: 'walk-past', words: 'people walking past' },
  { value: 'wheelchair', words: 'a wheelchair' },
] as const;
const SETS = [
  { value: 0, words: 'not asked' },
  { value: 1, words: 'one set' },
  { value: 2, words: 'two sets' },
] as const;
const NOT_SAID = -1;
const SPACES = [
  { value: NOT_SAID, words: 'not asked' },
  ...Array.from({ length: 13 }, (_, n) => ({ value: n, words: String(n) })),
];
const MOST_LENS_MM = 4000;
const MOST_DOOR_MM = 5000;
const MOST_DEPTH_MM = 2000;

/** What the set says about itself, so that more rules can be asked of it. */
export function AskedForm() {
  const { asked, ask } = useFitView();
  if (asked === undefined || ask === undefined) return null;
  const { door, appleBoxes } = asked;
  const sayDoor = (change: Partial<NonNullable<Asked['door']>>) => {
    const said = { clearWidthMm: 0, depthMm: 0, ...door, ...change };
    ask(said.clearWidthMm > 0 ? { ...asked, door: said } : without(asked, 'door'));
  };
  return (
    <div className="mt-8">
      <Disclosure words="What this set asks">
        <div className="grid gap-x-8 gap-y-5 phone:grid-cols-2 desk:grid-cols-4">
          <Select
            label="Posture"
            value={asked.backPosture}
            options={POSTURES}
            onChange={(backPosture) => ask({ ...asked, backPosture })}
          />
          <Select
            label="Who passes behind loose seats"
            value={asked.trafficBehind}
            options={TRAFFIC}
            onChange={(trafficBehind) => ask({ ...asked, trafficBehind })}
          />
          <SaidLength
            label="Height of the lens"
            optional
            valueMm={asked.lensHeightMm}
            maxMm={MOST_LENS_MM}
            onSay={(lensHeightMm) =>
              ask(lensHeightMm === undefined ? without(asked, 'lensHeightMm') : { ...asked, lensHeightMm })
            }
          />
          <Select
            label="Apple boxes at hand"
            value={appleBoxes ? Math.min(2, appleBoxes.full) : 0}
            options={SETS}
            onChange={(count) =>
              ask(
                count === 0
                  ? without(asked, 'appleBoxes')
                  : { ...asked, appleBoxes: { full: count, half: count, quarter: count, pancake: count } },
              )
            }
          />
          <SaidLength
            label="Clear width of the door"
            optional
            valueMm={door?.clearWidthMm}
            maxMm={MOST_DOOR_MM}
            onSay={(clearWidthMm) => sayDoor({ clearWidthMm: clearWidthMm ?? 0 })}
          />
          {door !== undefined && (
            <SaidLength
              label="Depth of the door opening"
              optional
              valueMm={door.depthMm}
              maxMm={MOST_DEPTH_MM}
              onSay={(depthMm) => sayDoor({ depthMm: depthMm ?? 0 })}
            />
          )}
          <Select
            label="Wheelchair spaces kept"
            value={asked.wheelchairSpaces ?? NOT_SAID}
            options={SPACES}
            onChange={(count) =>
              ask(
                count === NOT_SAID
                  ? without(asked, 'wheelchairSpaces')
                  : { ...asked, wheelchairSpaces: count },
              )
            }
          />
        </div>
        <AskedFloor />
      </Disclosure>
    </div>
  );
}
