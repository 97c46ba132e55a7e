import { confidenceWords } from '@settlewright/anthropometry';
import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { VerdictCounts } from '@/components/verdict.tsx';
import { download } from '@/lib/download.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useUnitStyle } from '@/lib/unit-choice.ts';
import { setAddress, useCast, useRevision, type FullRevision, type SetPath } from '../api.ts';
import { loadFitEngine } from '../engine.ts';
import { SaveDrawingButton } from '../export/save-drawing-button.tsx';
import { useRoomAddress } from '../hooks/use-address.ts';
import { usePieceActions } from '../hooks/use-piece-actions.ts';
import { createPictureMaker } from '../picture.ts';
import { RoomContext, usePicture, type RoomSurroundings } from '../room-context.tsx';
import { RoomStoreProvider } from '../room-store-provider.tsx';
import { createRoomStore } from '../store.ts';
import { ApprovalForm } from './approval-form.tsx';
import { KeyPlan } from './key-plan.tsx';
import { PiecesPanel } from './pieces-panel.tsx';
import { dayWords, momentWords } from '@/lib/dates.ts';
import { SceneStage } from './scene-stage.tsx';
import { SpecSentence } from './spec-sentence.tsx';

interface Props {
  path: SetPath;
  letter: string;
  setName: string;
}

/** One revision as it was issued: the drawing and the sentence, and nothing that changes them. */
export function RevisionView({ path, letter, setName }: Props) {
  const revision = useRevision(path, letter);
  if (revision.isError) return <Notice tone="wont">{sayProblem(revision.error)}</Notice>;
  if (!revision.data) return <LoadingLine words={`Fetching revision ${letter}`} />;
  return <Frozen path={path} setName={setName} revision={revision.data} />;
}

function Frozen({ path, setName, revision }: { path: SetPath; setName: string; revision: FullRevision }) {
  const style = useUnitStyle();
  const cast = useCast(path);
  const engine = useQuery({ queryKey: ['fit-engine'], queryFn: loadFitEngine, staleTime: Infinity });
  const [store] = useState(() => createRoomStore(revision.document));
  const surroundings = useMemo<RoomSurroundings | undefined>(
    () =>
      engine.data && cast.data
        ? {
            path,
            setName,
            canEdit: false,
            detail: revision.fitSheet.detail,
            style,
            cast: cast.data,
            engine: engine.data,
            maker: createPictureMaker(engine.data, cast.data, { server: revision.fitSheet }),
            issued: { letter: revision.letter, issuedAt: revision.issuedAt },
          }
        : undefined,
    [path, setName, style, revision, engine.data, cast.data],
  );
  return (
    <article aria-label={`Revision ${revision.letter}`} className="min-w-0">
      <RuleHeading
        aside={<span className="text-sm text-ink-3">issued {momentWords(revision.issuedAt)}</span>}
      >
        Revision {revision.letter}
      </RuleHeading>
      {revision.note && <p className="max-w-text whitespace-pre-line text-ink-2">{revision.note}</p>}
      <div className="mt-2 flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
        <VerdictCounts counts={revision.counts} />
        <Papers path={path} letter={revision.letter} />
      </div>
      {engine.data && (
        <p className="mt-1 text-sm text-ink-2">
          {confidenceWords(
            revision.fitSheet.confidence,
            engine.data.ruleBook,
            `as in force when issued on ${dayWords(revision.issuedAt)}`,
          )}
        </p>
      )}
      <ApprovalForm path={path} revision={revision} />
      {surroundings ? (
        <RoomContext value={surroundings}>
          <RoomStoreProvider store={store}>
            <FrozenRoom />
          </RoomStoreProvider>
        </RoomContext>
      ) : (
        <LoadingLine words="Drawing the set" />
      )}
    </article>
  );
}

function Papers({ path, letter }: { path: SetPath; letter: string }) {
  const [problem, setProblem] = useState<string>();
  const fetchPaper = (kind: 'pdf' | 'csv') => {
    setProblem(undefined);
    download(`${setAddress(path)}/revisions/${letter}/fit-sheet.${kind}`).catch((error: unknown) =>
      setProblem(sayProblem(error)),
    );
  };
  return (
    <p className="flex flex-wrap gap-x-4 text-sm">
      Fit sheet:
      <Button look="word" onClick={() => fetchPaper('pdf')}>
        paper (PDF)
      </Button>
      <Button look="word" onClick={() => fetchPaper('csv')}>
        table (CSV)
      </Button>
      {problem && <span className="text-wont">{problem}</span>}
    </p>
  );
}

function FrozenRoom() {
  const picture = usePicture();
  const address = useRoomAddress();
  const actions = usePieceActions(address.select);
  const { document } = picture;
  const piece = document.pieces.find((candidate) => candidate.id === address.pieceId);
  return (
    <div className="mt-6 grid gap-x-10 gap-y-6 tablet:grid-cols-[minmax(0,1fr)_15rem]">
      <div className="min-w-0">
        <div className="flex h-[28rem] flex-col max-tablet:h-auto">
          <SceneStage
            picture={picture}
            piece={piece}
            address={address}
            actions={actions}
            onOpenCell={() => undefined}
          />
        </div>
        {piece && <SpecSentence key={piece.id} piece={piece} />}
      </div>
      <div className="grid content-start gap-5">
        <PiecesPanel
          document={document}
          selectedPieceId={address.pieceId}
          onSelect={address.select}
          actions={actions}
        />
        <KeyPlan picture={picture} address={address} />
        <p>
          <SaveDrawingButton />
        </p>
        {document.knownDifferences.length > 0 && (
          <section>
            <RuleHeading>Known differences</RuleHeading>
            <ul className="grid gap-1 text-sm text-ink-2">
              {document.knownDifferences.map(({ id, text }) => (
                <li key={id}>{text}</li>
              ))}
            </ul>
          </section>
        )}
      </div>
    </div>
  );
}
