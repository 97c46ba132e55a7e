import type { NamedView } from '@settlewright/geometry';
import { lazy, Suspense } from 'react';
import { Button } from '@/components/button.tsx';
import { classNames } from '@/components/class-names.ts';
import { TextField } from '@/components/text-field.tsx';
import type { RoomAddress } from '../hooks/use-address.ts';
import type { RoomPicture } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { useViewActions, type ViewActions } from './use-view-actions.ts';

const LensForm = lazy(() => import('./lens-form.tsx'));

/** The views that somebody gave a name to, after the lettered ones. */
export function NamedViews({ picture, address }: { picture: RoomPicture; address: RoomAddress }) {
  const { canEdit } = useSurroundings();
  const actions = useViewActions(address);
  const views = picture.document.views ?? [];
  if (views.length === 0 && !canEdit) return null;
  return (
    <div className="mt-3">
      <h3 id="views-heading" className="text-sm font-medium">
        Named views
      </h3>
      {views.length > 0 && (
        <ul aria-labelledby="views-heading" className="mt-1">
          {views.map((view) => (
            <Row key={view.id} view={view} picture={picture} address={address} actions={actions} />
          ))}
        </ul>
      )}
      {canEdit && (
        <p className="mt-1 flex flex-wrap gap-x-4">
          <Button look="word" onClick={actions.keepPresent}>
            Keep this view
          </Button>
          <Button look="word" onClick={() => actions.addLens(picture)}>
            Add a lens
          </Button>
        </p>
      )}
    </div>
  );
}

interface RowProps {
  view: NamedView;
  picture: RoomPicture;
  address: RoomAddress;
  actions: ViewActions;
}

function Row({ view, picture, address, actions }: RowProps) {
  const { canEdit } = useSurroundings();
  const chosen = address.namedId === view.id;
  const seen = chosen && address.throughNamed;
  return (
    <li className="border-b border-rule py-0.5">
      <button
        type="button"
        aria-current={seen ? 'true' : undefined}
        onClick={() => address.showNamed({ id: view.id, clientView: view.shown.clientView })}
        className={classNames(
          'quick flex min-h-8 w-full items-baseline max-tablet:min-h-10 justify-between gap-3 rounded-sm px-1 text-left hover:bg-sunk',
          seen && 'font-medium text-chalk',
        )}
      >
        <span className="min-w-0 break-words">{view.name}</span>
        <span className="shrink-0 text-xs text-ink-3">
          {view.camera.kind === 'lens'
            ? `${view.camera.focalLengthMm} mm lens`
            : `view ${view.camera.letter}`}
        </span>
      </button>
      {chosen && (
        <div className="grid gap-3 px-1 pt-1 pb-3">
          {canEdit && (
            <TextField
              // What is taken on leaving the field is a new field.
              key={view.name}
              label="Name of the view"
              defaultValue={view.name}
              maxLength={80}
              onBlur={(event) => actions.rename(view, event.target.value)}
              onKeyDown={(event) => {
                if (event.key === 'Enter') actions.rename(view, event.currentTarget.value);
              }}
            />
          )}
          {view.camera.kind === 'lens' && (
            <Suspense fallback={null}>
              <LensForm
                view={view}
                lens={view.camera}
                picture={picture}
                address={address}
                actions={actions}
              />
            </Suspense>
          )}
          <p className="flex flex-wrap gap-x-4">
            {canEdit && view.camera.kind === 'letter' && (
              <Button look="word" onClick={() => actions.keepOver(view)}>
                Keep as seen now
              </Button>
            )}
            {canEdit && (
              <Button look="word" onClick={() => actions.remove(view)}>
                Delete<span className="sr-only"> the view {view.name}</span>
              </Button>
            )}
            <Button look="word" onClick={() => address.showNamed(undefined)}>
              Close
            </Button>
          </p>
        </div>
      )}
    </li>
  );
}
