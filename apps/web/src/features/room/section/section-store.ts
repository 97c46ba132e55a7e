import type { NamedView } from '@settlewright/geometry';
import { useLayoutEffect, useMemo } from 'react';
import { create } from 'zustand';
import type { Cut } from '../scene/views.ts';
import { cutOf, planeOfView, type SectionPlane } from './section-plane.ts';

/** The cut of every set that was looked at, by its id; it lasts as long as the page, or in a named view. */
const useSections = create<Readonly<Record<string, SectionPlane | undefined>>>(() => ({}));

export const useSectionPlane = (setId: string): SectionPlane | undefined => useSections((all) => all[setId]);

export const sectionPlaneNow = (setId: string): SectionPlane | undefined => useSections.getState()[setId];

export const cutAt = (setId: string, plane: SectionPlane | undefined): void =>
  useSections.setState({ [setId]: plane });

/** The cut in force; a named view brings its own, or none, when it is opened. */
export function useSectionCut(setId: string, named: NamedView | undefined): Cut | undefined {
  const plane = useSectionPlane(setId);
  const own = useMemo(() => named && planeOfView(named), [named]);
  useLayoutEffect(() => {
    if (named) cutAt(setId, own);
    // Only the opening of a view sets the cut: afterwards the hand moves it.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [setId, named?.id]);
  return useMemo(
    () => (plane ? cutOf(plane) : own ? undefined : named?.section),
    [plane, own, named?.section],
  );
}
