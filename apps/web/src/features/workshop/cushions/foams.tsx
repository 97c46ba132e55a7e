import { FOAM_PRESETS, foamText, type FoamGrade } from '@settlewright/geometry';
import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Disclosure } from '@/components/disclosure.tsx';
import { Measure } from '@/components/measure.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import type { KeptCushionSettings } from '@/lib/cushion-settings.ts';
import { useFormat } from '@/lib/format.ts';
import type { WorkshopAtHand } from '@/lib/workshop.ts';
import { FoamDialog } from './foam-dialog.tsx';

function Facts({ foam }: { foam: FoamGrade }) {
  const { style, length } = useFormat();
  const { densityKgM3, ifd25N, supportFactor, thicknessMm, layers, wrapMm } = foam;
  return (
    <span className="text-sm text-ink-2">
      {foamText('density', densityKgM3, style)}, firmness {foamText('firmness', ifd25N, style)} (25 % IFD),
      support factor {supportFactor}, <Measure text={length(thicknessMm)} /> thick
      {layers.length > 0 && `, ${layers.length} layers: ${layers.map(({ name }) => name).join(' on ')}`}
      {wrapMm > 0 && (
        <>
          , <Measure text={length(wrapMm)} /> of wrap
        </>
      )}
    </span>
  );
}

/** The foams a workshop buys, beside those everybody begins with. */
export function Foams({ workshop, kept }: { workshop: WorkshopAtHand; kept: KeptCushionSettings }) {
  const [shown, setShown] = useState<{ index: number | null } | null>(null);
  const { foams } = kept.settings;
  return (
    <section>
      <RuleHeading
        aside={
          workshop.canEdit && (
            <Button look="word" onClick={() => setShown({ index: null })}>
              Add a foam
            </Button>
          )
        }
      >
        Foams of the shop
      </RuleHeading>
      {foams.length === 0 && (
        <p className="border-b border-rule py-3 text-sm text-ink-2">
          None of its own yet. What a foam feels like and how long it lasts are two numbers: say both.
        </p>
      )}
      <ul>
        {foams.map((foam, index) => (
          <li
            key={foam.name}
            className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule py-2"
          >
            <span className="grid min-w-0">
              <span className="font-medium">{foam.name}</span>
              <Facts foam={foam} />
            </span>
            {workshop.canEdit && (
              <Button look="word" onClick={() => setShown({ index })}>
                Change<span className="sr-only"> {foam.name}</span>
              </Button>
            )}
          </li>
        ))}
      </ul>
      <div className="pt-2">
        <Disclosure words={`${FOAM_PRESETS.length} that everybody begins with`}>
          <ul>
            {FOAM_PRESETS.map((foam) => (
              <li key={foam.name} className="grid border-b border-rule py-2">
                <span className="font-medium">
                  {foam.name} <span className="font-normal text-ink-3">({foam.source})</span>
                </span>
                <Facts foam={foam} />
              </li>
            ))}
          </ul>
        </Disclosure>
      </div>
      {shown && (
        <FoamDialog
          key={`${shown.index}`}
          workshopId={workshop.id}
          kept={kept}
          index={shown.index}
          onClose={() => setShown(null)}
        />
      )}
    </section>
  );
}
