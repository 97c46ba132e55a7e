import { FOAM_PRESETS, foamOfGrade, foamText, type FoamGrade } from '@settlewright/geometry';
import { useMemo, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';
import { Select } from '@/components/select.tsx';
import { useFormat } from '@/lib/format.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoom } from '../store.ts';
import { foamEffect, withFoam } from './foam-effect.ts';
import { FoamEffectWords } from './foam-effect-words.tsx';
import type { Making } from './use-make.ts';

const AS_NOW = '';

/** Another foam: what it would do to the fit sheet stands here before it is taken. */
export function FoamFields({
  making,
  foams,
  wrapLostMm,
}: {
  making: Making;
  foams: readonly FoamGrade[];
  /** Lost of each inch of wrap under a sitter. */
  wrapLostMm: number;
}) {
  const { piece, spec, canEdit, changePiece } = making;
  const { maker, engine } = useSurroundings();
  const format = useFormat();
  const document = useRoom((state) => state.document);
  const [name, setName] = useState(AS_NOW);
  const cushion = spec.kind === 'back' && piece.kind === 'bench' ? piece.backCushion : piece.seatCushion;
  const [thickness, setThickness] = useState<QuantityEntry | null>(null);
  const grades = useMemo(
    () =>
      [...foams, ...FOAM_PRESETS.filter((preset) => !foams.some((own) => own.name === preset.name))].filter(
        ({ use }) => use === 'either' || use === spec.kind,
      ),
    [foams, spec.kind],
  );
  const grade = grades.find((one) => one.name === name);
  const thicknessMm = thickness?.problem ? cushion.thicknessMm : (thickness?.value ?? cushion.thicknessMm);
  const foam = useMemo(() => {
    if (!grade) return cushion.foam;
    return foamOfGrade(grade, wrapLostMm);
  }, [grade, cushion.foam, wrapLostMm]);
  const differs = foam !== cushion.foam || Math.abs(thicknessMm - cushion.thicknessMm) > 1e-6;
  const effect = useMemo(() => {
    const changed = differs ? withFoam(piece, spec.kind, foam, thicknessMm) : piece;
    const pieces = document.pieces.map((one) => (one.id === piece.id ? changed : one));
    const after = differs ? { ...document, pieces } : document;
    return foamEffect(
      { before: document, after, piece: changed },
      maker.check,
      maker.picture(document).bodies,
      engine.ruleBook,
    );
  }, [document, piece, spec.kind, foam, thicknessMm, differs, maker, engine]);
  const clear = () => {
    setName(AS_NOW);
    setThickness(null);
  };
  const facts = ({ densityKgM3, ifd25N }: Pick<FoamGrade, 'densityKgM3' | 'ifd25N'>) =>
    `${foamText('density', densityKgM3, format.style)}, ${foamText('firmness', ifd25N, format.style)}`;
  return (
    <div className="grid gap-4">
      <p className="text-sm text-ink-2">
        All {spec.kind === 'seat' ? 'seats' : 'backs'} of {piece.mark}: {cushion.foam.grade},{' '}
        {facts(cushion.foam)}, {format.length(cushion.thicknessMm)} thick
        {cushion.foam.layers && `, in ${cushion.foam.layers.length} layers`}
        {cushion.foam.wrap &&
          `, with ${format.length(cushion.foam.wrap.thicknessMm)} of wrap over it, of which ${format.length(cushion.foam.wrap.lostMm)} is lost under a sitter`}
        .
      </p>
      {canEdit && (
        <div className="grid items-start gap-x-6 gap-y-4 phone:grid-cols-2">
          <Select
            label="Try another foam"
            value={name}
            options={[
              { value: AS_NOW, words: 'as now' },
              ...grades.map((one) => ({ value: one.name, words: one.name, detail: facts(one) })),
            ]}
            description={grade && `Usually ${format.length(grade.thicknessMm)} thick.`}
            onChange={setName}
          />
          <LengthField
            label="Try a thickness"
            entry={thickness ?? entryOf(cushion.thicknessMm)}
            onChange={setThickness}
            minMm={5}
            maxMm={250}
            error={thickness?.problem}
          />
        </div>
      )}
      <FoamEffectWords effect={effect} differs={differs} isSeat={spec.kind === 'seat'} />
      {differs && canEdit && (
        <p className="flex flex-wrap gap-3">
          <Button
            look="main"
            onClick={() => {
              changePiece(
                (one) => withFoam(one, spec.kind, foam, thicknessMm),
                `${spec.kind} foam: ${foam.grade}, ${format.length(thicknessMm)}`,
              );
              clear();
            }}
          >
            Take it
          </Button>
          <Button onClick={clear}>Keep the foam as it is</Button>
        </p>
      )}
    </div>
  );
}
