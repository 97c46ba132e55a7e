import { createBodyModel } from '@settlewright/anthropometry';
import survey from '@settlewright/seed-data/populations/ansur2.json';
import { Length } from '@/components/length.tsx';

const GROUPS = [
  { bodyData: 'women', words: 'Women' },
  { bodyData: 'men', words: 'Men' },
] as const;
const PERCENTILES = [5, 50, 95];

const model = createBodyModel(survey);

/** Stature and back-of-knee height at the usual percentiles, from the survey itself. */
export default function MannequinTable() {
  return (
    <table className="w-full max-w-text border-collapse text-sm">
      <caption className="sr-only">Stature of percentile mannequins</caption>
      <thead>
        <tr className="border-b-[1.25px] border-ink text-xs text-ink-3">
          <th scope="col" className="py-1.5 text-left font-medium">
            Stature, without shoes
          </th>
          {PERCENTILES.map((percentile) => (
            <th key={percentile} scope="col" className="py-1.5 text-right font-medium">
              {percentile}th
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {GROUPS.map(({ bodyData, words }) => (
          <tr key={bodyData} className="border-b border-rule">
            <th scope="row" className="py-2 text-left font-medium">
              {words}
            </th>
            {PERCENTILES.map((percentile) => (
              <td key={percentile} className="py-2 text-right">
                <Length mm={model.percentile(bodyData, 'stature', percentile)} feet />
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
