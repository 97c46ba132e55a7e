import { DxfWriter, Units } from '@tarikjabiri/dxf';

/**
 * An empty drawing for another program.
 *
 * @param units - of the file, said in its header
 */
export function newDxf(units: 'millimetres' | 'inches'): DxfWriter {
  const dxf = new DxfWriter();
  dxf.setUnits(units === 'inches' ? Units.Inches : Units.Millimeters);
  dxf.setVariable('$MEASUREMENT', { 70: units === 'inches' ? 0 : 1 });
  dxf.setVariable('$LASTSAVEDBY', { 1: 'Settlewright' });
  return dxf;
}
