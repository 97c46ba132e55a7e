import { cushionWarningWords, deriveCushions, makeWords } from '@settlewright/geometry';
import { useMemo, useState } from 'react';
import { Dialog } from '@/components/dialog.tsx';
import { Disclosure } from '@/components/disclosure.tsx';
import { Notice } from '@/components/notice.tsx';
import { Select } from '@/components/select.tsx';
import { capital } from '@/lib/capital.ts';
import { useCushionRules } from '@/lib/cushion-settings.ts';
import { useFormat } from '@/lib/format.ts';
import type { PieceActions } from '../hooks/use-piece-actions.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoom } from '../store.ts';
import { TestSits } from '../test-sits/test-sits.tsx';
import { FoamFields } from './foam-fields.tsx';
import { JointsFields } from './joints-fields.tsx';
import { MakeFields } from './make-fields.tsx';
import { PlanPicture } from './plan-picture.tsx';
import { ShapeFields } from './shape-fields.tsx';
import { TuftingFields } from './tufting-fields.tsx';
import { useMaking, type CushionedPiece } from './use-make.ts';
import { WearFields } from './wear-fields.tsx';

interface MakeDialogProps {
  piece: CushionedPiece;
  actions: PieceActions;
  onClose: () => void;
}

/** What is chosen of the cushions of a piece, one at a time, with its plan drawn as it changes. */
export default function MakeDialog({ piece: opened, actions, onClose }: MakeDialogProps) {
  const { canEdit, path } = useSurroundings();
  const rules = useCushionRules(path.workshopId);
  const { style } = useFormat();
  const document = useRoom((state) => state.document);
  const piece = document.pieces.find(
    (one): one is CushionedPiece =>
      one.id === opened.id && (one.kind === 'bench' || one.kind === 'loose-seat'),
  );
  const cushions = useMemo(
    () => deriveCushions(document, rules.settings).filter(({ benchId }) => benchId === opened.id),
    [document, rules, opened.id],
  );
  const [key, setKey] = useState<string | undefined>();
  const spec = cushions.find((one) => one.key === key) ?? cushions[0];
  const choice = (spec && document.cushions?.[spec.key]) ?? {};
  const making = useMaking({ piece: piece ?? opened, spec, choice, canEdit, actions });
  return (
    <Dialog open onClose={onClose} wide title={`Cushions of ${opened.mark}`}>
      {!making || !spec ? (
        <p>{opened.mark} has no cushions now.</p>
      ) : (
        <div className="grid gap-6 tablet:grid-cols-2">
          <div className="grid content-start gap-4 self-start tablet:sticky tablet:top-4">
            <Select
              label="Cushion"
              value={spec.key}
              options={cushions.map((one) => ({
                value: one.key,
                words: `${one.mark}, ${one.kind} ${one.place.number} of ${one.place.of}`,
              }))}
              onChange={setKey}
            />
            <PlanPicture spec={spec} />
            <p className="text-sm text-ink-2">
              Finished, seam to seam. {capital(makeWords(spec.make, spec.kind))}. Thick line: closure; dashes:
              seen by the camera{spec.wear ? '; hatched: to look used' : ''}.
            </p>
            {spec.faults.length > 0 && (
              <Notice tone="wont">It cannot be made so: {spec.faults.join('; ')}.</Notice>
            )}
            {spec.warnings.map((warning) => (
              <Notice key={warning.code}>{cushionWarningWords(warning, style)}</Notice>
            ))}
          </div>
          <div key={spec.key} className="grid content-start gap-2">
            <Disclosure open words="How it is made">
              <MakeFields {...making} />
            </Disclosure>
            {canEdit && (
              <Disclosure words="Shape">
                <ShapeFields {...making} />
              </Disclosure>
            )}
            <Disclosure words="Buttons and tufts">
              <TuftingFields {...making} />
            </Disclosure>
            {canEdit && (
              <Disclosure words="Marked wear">
                <WearFields {...making} />
              </Disclosure>
            )}
            {canEdit && piece?.kind === 'bench' && (
              <Disclosure words="Joints of the run">
                <JointsFields {...making} />
              </Disclosure>
            )}
            <Disclosure words="Foam, and what another would do">
              <FoamFields making={making} foams={rules.foams} wrapLostMm={rules.settings.wrapLost.valueMm} />
            </Disclosure>
            {spec.kind === 'seat' && (
              <Disclosure words="Test sits">
                <TestSits making={making} />
              </Disclosure>
            )}
          </div>
        </div>
      )}
    </Dialog>
  );
}
