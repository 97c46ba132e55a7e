import { isUncertainCell, type NextMeasures, type Sitter, type SitterRow } from '@settlewright/anthropometry';
import { useEffect, useRef, useState } from 'react';
import { useFitView, type FitView } from '../fit-view.ts';
import { askNext } from './ask-next.ts';
import type { NextQuestion } from './next-question.ts';

/** A set that is being changed is left alone until it rests. */
const REST_MS = 600;

interface Asked {
  row: SitterRow;
  question: NextQuestion;
}

/** Answers stay with the row they are about; a changed sheet has new rows. */
const known = new WeakMap<SitterRow, NextMeasures>();

/** What to measure next, by row; it fills in one after the other once the sheet rests. */
export function useNextMeasures(): ReadonlyMap<SitterRow, NextMeasures> {
  const { sheet, basis, ruleBook } = useFitView();
  const [, setFound] = useState(0);
  const latest = useRef(basis);
  useEffect(() => {
    latest.current = basis;
  }, [basis]);
  // Pointing at a cell makes a new basis of the same sheet; that is no reason to begin again.
  const shown = basis !== undefined;
  useEffect(() => {
    if (!shown) return undefined;
    let left = false;
    const timer = setTimeout(() => {
      void (async () => {
        for (const { row, question } of latest.current ? questionsOf(sheet, latest.current, ruleBook) : []) {
          if (left) return;
          const answer = await askNext(question).catch(() => null);
          if (answer === null) return;
          known.set(row, answer);
          if (!left) setFound((count) => count + 1);
        }
      })();
    }, REST_MS);
    return () => {
      left = true;
      clearTimeout(timer);
    };
  }, [sheet, shown, ruleBook]);
  return new Map(
    sheet.rows.flatMap((row) => {
      const next = shown ? known.get(row) : undefined;
      return next ? [[row, next] as const] : [];
    }),
  );
}

/** One question for each sitter of the cast with a check that is not sure and was not asked about before. */
function questionsOf(
  { rows, confidence }: FitView['sheet'],
  { situation, sitters, settings }: NonNullable<FitView['basis']>,
  ruleBook: FitView['ruleBook'],
): Asked[] {
  // A worker takes data, no functions.
  const rules = JSON.parse(JSON.stringify(ruleBook)) as NextQuestion['rules'];
  return rows.flatMap((row): Asked[] => {
    const sitter = sitters.find(({ id, placeId }) => id === row.sitterId && placeId === row.placeId);
    const place = situation.places.find(({ placeId }) => placeId === row.placeId);
    if (!sitter || !place || !isOpen(row, sitter, confidence) || known.has(row)) return [];
    const only = { places: [place], benches: [], tables: [], facing: [], corners: [], ways: [] };
    return [{ row, question: { situation: only, sitter, settings, confidence, rules } }];
  });
}

const isOpen = (row: SitterRow, sitter: Sitter, confidence: number): boolean =>
  sitter.kind === 'cast' && !sitter.noBody && row.cells.some((cell) => isUncertainCell(cell, confidence));
