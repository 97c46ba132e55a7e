import type { SetDocument } from '../room/document.ts';
import { MAX_VIEWS, type NamedView } from './named-view.ts';

/**
 * Keeps a view under a name.
 *
 * @param document - the set
 * @param view - with an id that no other has
 * @returns the new set; the same when it holds as many views as it may, or one of that id
 */
export function addView(document: SetDocument, view: NamedView): SetDocument {
  const views = document.views ?? [];
  if (views.length >= MAX_VIEWS || views.some(({ id }) => id === view.id)) return document;
  return { ...document, views: [...views, view] };
}

/**
 * Changes a named view.
 *
 * @param document - the set
 * @param viewId - an unknown id changes nothing
 * @param change - what is new of it
 * @returns the new set
 */
export function changeView(
  document: SetDocument,
  viewId: string,
  change: Partial<Omit<NamedView, 'id'>>,
): SetDocument {
  if (!document.views?.some(({ id }) => id === viewId)) return document;
  const views = document.views.map((view) => (view.id === viewId ? { ...view, ...change } : view));
  return { ...document, views };
}

/**
 * Takes a named view away.
 *
 * @param document - the set
 * @param viewId - an unknown id changes nothing
 * @returns the new set
 */
export function removeView(document: SetDocument, viewId: string): SetDocument {
  if (!document.views?.some(({ id }) => id === viewId)) return document;
  const { views, ...others } = document;
  const left = views.filter(({ id }) => id !== viewId);
  return left.length === 0 ? others : { ...others, views: left };
}

/**
 * A name that no view has yet: "Lens", "Lens 2", "Lens 3".
 *
 * @param document - the set
 * @param wish - at most 70 characters
 * @returns the wish itself where it is free
 */
export function freeViewName(document: SetDocument, wish: string): string {
  const taken = new Set(document.views?.map(({ name }) => name.toLowerCase()));
  if (!taken.has(wish.toLowerCase())) return wish;
  let n = 2;
  while (taken.has(`${wish} ${n}`.toLowerCase())) n += 1;
  return `${wish} ${n}`;
}
