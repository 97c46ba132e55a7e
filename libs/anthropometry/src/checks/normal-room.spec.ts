import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { doubted, fixed } from './amount.ts';
import { probabilityWithin, rangeOfRoom } from './normal-room.ts';
import { probabilityOfRoom, roomQuantile, roomWithin } from './room.ts';
import { cushionDrop } from './sink-band.ts';

const foam = { thicknessMm: 100, ifd25N: 160, supportFactor: 2 };
const drop = cushionDrop(foam, 77);
const mm = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('a value that is normal between plain lines', () => {
  it('has the odds and the range that the general way gives', () => {
    fc.assert(
      fc.property(
        mm(-40, 40),
        mm(0.5, 20),
        fc.option(mm(0, 60)),
        fc.option(mm(0, 60)),
        (best, sd, below, above) => {
          fc.pre(below !== null || above !== null);
          const lines = {
            ...(below === null ? {} : { lower: -below }),
            ...(above === null ? {} : { upper: above }),
          };
          const band = {
            ...(below === null ? {} : { lower: fixed(-below) }),
            ...(above === null ? {} : { upper: fixed(above) }),
          };
          const rooms = roomWithin(doubted(fixed(best), { foam, drop, by: sd }), band);
          const value = { best, sd };
          expect(probabilityWithin(value, lines, 0.1)).toBeCloseTo(probabilityOfRoom(rooms, -0.1), 6);
          const { low, high } = rangeOfRoom(value, lines);
          expect(Math.abs(low - roomQuantile(rooms, 0.05, 0.005))).toBeLessThan(0.05);
          expect(Math.abs(high - roomQuantile(rooms, 0.95, 0.005))).toBeLessThan(0.05);
        },
      ),
    );
  });
});
