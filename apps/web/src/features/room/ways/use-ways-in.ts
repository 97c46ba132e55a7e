import { ruleNumber } from '@settlewright/anthropometry';
import type { Comer, MayMove, SetDocument, WaysIn } from '@settlewright/geometry';
import { useEffect, useMemo, useState } from 'react';
import { faultWords } from '@/lib/ask-worker.ts';
import { useSurroundings } from '../room-context.tsx';
import { sitterName, sittersOf } from '../sitters.ts';
import { askWays } from './ask-ways.ts';

/** Somebody on the way in, with the name that the page calls them by. */
export interface NamedComer extends Comer {
  name: string;
}

export interface WaysFound {
  comers: readonly NamedComer[];
  /** Names of who sits in the set and has no measures here, or none that make a body: nothing is said of them. */
  leftOut: readonly string[];
  /** Names of the children who sit in the set: nothing is said of them either, for another reason. */
  children: readonly string[];
  heightsMm: readonly [number, number];
  /** Of this very document; undefined while it is looked for. */
  found: WaysIn | undefined;
  fault: string | undefined;
}

/** The ways in of everybody whose measures this reader may see; looked for again when the set changes. */
export function useWaysIn(document: SetDocument, mayMove: MayMove): WaysFound {
  const { engine, cast } = useSurroundings();
  const { model, ruleBook } = engine;
  const heightsMm = useMemo(() => {
    const rule = ruleBook.rule('EGRESS-08');
    return [ruleNumber(rule, 'steppedOver'), ruleNumber(rule, 'leanedUnder')] as const;
  }, [ruleBook]);
  const comers = useMemo(
    () =>
      sittersOf(document, cast, model).flatMap(({ placeId, name, person, noBody }): NamedComer[] => {
        // Nothing is said of the way of a child: the breadths it is drawn with are borrowed.
        if (noBody || person.child) return [];
        const { shoeMm, clothing } = person;
        const measures = model.predict(person).means();
        // A slipped digit in one measure may put another below nothing: such a body would pass everywhere.
        if (Object.values(measures).some((value) => !(value > 0))) return [];
        return [{ placeId, name, measures, shoeMm, clothing }];
      }),
    [document, cast, model],
  );
  const leftOut = useMemo(() => {
    const counted = new Set(comers.map(({ placeId }) => placeId));
    const uncounted = document.seating.filter(({ pieceId, place }) => !counted.has(`${pieceId}:${place}`));
    const named = (children: boolean) =>
      uncounted
        .filter(({ sitter }) => (sitter.kind === 'child') === children)
        .map(({ sitter }) => sitterName(sitter, cast));
    return { measures: named(false), children: named(true) };
  }, [document, cast, comers]);
  const [answer, setAnswer] = useState<{
    to: typeof comers;
    moving: MayMove;
    found?: WaysIn;
    fault?: string;
  }>();
  useEffect(() => {
    let wanted = true;
    askWays({ document, comers, heightsMm, mayMove }, () => wanted).then(
      (found) => wanted && found && setAnswer({ to: comers, moving: mayMove, found }),
      (fault: unknown) => wanted && setAnswer({ to: comers, moving: mayMove, fault: faultWords(fault) }),
    );
    return () => {
      wanted = false;
    };
  }, [document, comers, heightsMm, mayMove]);
  const current = answer?.to === comers && answer.moving === mayMove ? answer : undefined;
  return {
    comers,
    leftOut: leftOut.measures,
    children: leftOut.children,
    heightsMm,
    found: current?.found,
    fault: current?.fault,
  };
}
