import { dimensionsOf } from '@settlewright/geometry';
import { useMemo } from 'react';
import { Link } from 'react-router-dom';
import { Combobox } from '@/components/combobox.tsx';
import { EmptyState } from '@/components/empty-state.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { dimensionWords } from '@/lib/dimension-words.ts';
import { useChoices } from '../choices-view.ts';
import { useCrowd } from '../use-crowd.ts';
import { useStick, useTriedValues } from '../use-stick.ts';
import { EVERY_CHECK, useStickAddress } from '../use-stick-address.ts';
import { movingWords } from '../words.ts';
import { RuleChooser } from './rule-chooser.tsx';
import { StickDesk } from './stick-desk.tsx';
import { TwoDimensions } from './two-dimensions.tsx';

interface StickPageProps {
  roomTo: string;
  fitTo: string;
}

/** One dimension of a set, everybody who sits there, and a choice. */
export function StickPage(links: StickPageProps) {
  const { detail, check, document } = useChoices();
  const seated = useMemo(() => check(document).rows.length > 0, [check, document]);
  if (detail === 'verdicts') {
    return (
      <div className="page">
        <PageHeading title="Story stick" actions={<Ways {...links} />} />
        <Notice>
          A story stick shows from which value to which each person fits, and that gives their bodies away. It
          is for members who may see measures; the verdicts stand in the fit sheet.
        </Notice>
      </div>
    );
  }
  if (!seated) {
    return (
      <div className="page">
        <PageHeading title="Story stick" actions={<Ways {...links} />} />
        <EmptyState
          title="Nobody is seated"
          actions={
            <Link className="link" to={links.roomTo}>
              Seat people in the room
            </Link>
          }
        >
          A story stick shows from which value to which each sitter fits. Choose a bench in the room and say
          who sits at each place.
        </EmptyState>
      </div>
    );
  }
  return <Stick {...links} />;
}

function Ways({ roomTo, fitTo }: StickPageProps) {
  return (
    <>
      <Link className="link self-center" to={fitTo}>
        Fit sheet
      </Link>
      <Link className="link self-center" to={roomTo}>
        Back to the room
      </Link>
    </>
  );
}

function Stick(links: StickPageProps) {
  const { document, ruleBook } = useChoices();
  const address = useStickAddress();
  const asked = useCrowd(address.crowd);
  const offered = useMemo(() => dimensionsOf(document), [document]);
  const choices = useMemo(
    () => offered.map((one) => ({ id: one.id, words: dimensionWords(one) })),
    [offered],
  );
  const wanted = address.dimensionId ?? offered[0]?.id ?? '';
  const tried = useTriedValues(wanted);
  const own = tried?.dimension.ruleId ?? '';
  // Rules about benches and tables have no band of a sitter.
  const first = own && ruleBook.rule(own).scope === 'person' ? own : EVERY_CHECK;
  const rule = address.rule ?? first;
  const { stick, done } = useStick(tried, rule);
  const { dimension } = tried ?? {};
  return (
    <div className="page">
      <PageHeading
        title={dimension?.label ?? 'Story stick'}
        below={dimension && movingWords(dimension)}
        actions={<Ways {...links} />}
      />
      <div className="ruled mb-5 flex flex-wrap items-end justify-between gap-x-8 gap-y-3 pt-3">
        <div className="grid w-full max-w-[52rem] gap-4 phone:grid-cols-[3fr_2fr]">
          <Combobox
            label="Dimension"
            value={wanted}
            choices={choices}
            onChange={(id) => id && address.go({ d: id, rule: undefined })}
          />
          {stick && (
            <RuleChooser
              rule={rule}
              ruleIds={stick.ruleIds}
              first={first}
              onChange={(id) => address.go({ rule: id === first ? undefined : id })}
            />
          )}
        </div>
      </div>
      {!tried && <Notice>This set has no such number now. Choose another dimension.</Notice>}
      {tried && !stick && (
        <LoadingLine
          words={done > 0 ? `Finding the bands, ${Math.round(done * 100)} in 100 done` : 'Finding the bands'}
        />
      )}
      {tried && stick && (
        <>
          <StickDesk
            key={`${tried.dimension.id} ${rule}`}
            tried={tried}
            stick={stick}
            rule={rule}
            crowd={address.crowd}
            asked={asked}
            onCrowd={({ populationId, women }) => address.go({ people: populationId, women: String(women) })}
          />
          <TwoDimensions
            tried={tried}
            offered={offered}
            second={address.second}
            crowd={address.crowd}
            asked={asked}
            everyCheck={address.everyCheck}
            onSecond={(id) => address.go({ d2: id })}
            onEveryCheck={(on) => address.go({ map: on ? EVERY_CHECK : undefined })}
          />
        </>
      )}
    </div>
  );
}
