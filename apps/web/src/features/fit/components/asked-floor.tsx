import { type Asked, without } from '../asked.ts';
import { useFitView } from '../fit-view.ts';
import { AskedPlan } from './asked-plan.tsx';
import { RouteCorners } from './route-corners.tsx';
import { RouteStart } from './route-start.tsx';
import { TurningSpot } from './turning-spot.tsx';

/** What is asked of the floor: the route that is kept clear and the space for turning round, beside their plan. */
export function AskedFloor() {
  const { asked, ask, document } = useFitView();
  if (asked === undefined || ask === undefined || document === undefined) return null;
  const sayRoute = (route: Asked['route'], doing: string) =>
    ask(route === undefined ? without(asked, 'route') : { ...asked, route }, doing);
  const sayTurning = (turningAt: Asked['turningAt'], doing: string) =>
    ask(turningAt === undefined ? without(asked, 'turningAt') : { ...asked, turningAt }, doing);
  return (
    <div className="mt-8 grid gap-x-10 gap-y-6 desk:grid-cols-2">
      <div className="grid content-start gap-6">
        <section aria-labelledby="asked-route">
          <h3 id="asked-route" className="mb-2 font-medium">
            Route kept clear
          </h3>
          {asked.route ? (
            <RouteCorners route={asked.route} onSay={sayRoute} />
          ) : (
            <RouteStart pieces={document.pieces} onSay={sayRoute} />
          )}
        </section>
        <section aria-labelledby="asked-turning">
          <h3 id="asked-turning" className="mb-2 font-medium">
            Space for turning round
          </h3>
          <TurningSpot document={document} onSay={sayTurning} />
        </section>
      </div>
      <AskedPlan document={document} onRoute={sayRoute} onTurning={sayTurning} />
    </div>
  );
}
