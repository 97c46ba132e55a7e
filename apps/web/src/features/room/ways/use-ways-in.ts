import { ruleNumber } from '@settlewright/anthropometry';
import type { Comer, SetDocument, WaysIn } from '@settlewright/geometry';
import { useEffect, useMemo, useState } from 'react';
import { useSurroundings } from '../room-context.tsx';
import { sittersOf } from '../sitters.ts';
import { askWays } from './ask-ways.ts';

/** Somebody on the way in, with the name that the page calls them by. */
export interface NamedComer extends Comer {
  name: string;
}

export interface WaysFound {
  comers: readonly NamedComer[];
  heightsMm: readonly [number, number];
  /** Of this very document; undefined while it is looked for. */
  found: WaysIn | undefined;
  fault: string | undefined;
}

/** The ways in of everybody whose measures this reader may see; looked for again when the set changes. */
export function useWaysIn(document: SetDocument): WaysFound {
  const { engine, cast } = useSurroundings();
  const { model, ruleBook } = engine;
  const heightsMm = useMemo(() => {
    const rule = ruleBook.rule('EGRESS-08');
    return [ruleNumber(rule, 'steppedOver'), ruleNumber(rule, 'leanedUnder')] as const;
  }, [ruleBook]);
  const comers = useMemo(
    () =>
      sittersOf(document, cast, model).flatMap(({ placeId, name, person, noBody }): NamedComer[] => {
        if (noBody) return [];
        const { shoeMm, clothing } = person;
        return [{ placeId, name, measures: model.predict(person).means(), shoeMm, clothing }];
      }),
    [document, cast, model],
  );
  const [answer, setAnswer] = useState<{ to: typeof comers; found?: WaysIn; fault?: string }>();
  useEffect(() => {
    let wanted = true;
    askWays({ document, comers, heightsMm }).then(
      (found) => wanted && setAnswer({ to: comers, found }),
      (fault: unknown) =>
        wanted && setAnswer({ to: comers, fault: fault instanceof Error ? fault.message : String(fault) }),
    );
    return () => {
      wanted = false;
    };
  }, [document, comers, heightsMm]);
  const current = answer?.to === comers ? answer : undefined;
  return { comers, heightsMm, found: current?.found, fault: current?.fault };
}
