import { createBrowserRouter } from 'react-router-dom';
import { LoadingLine } from '@/components/loading.tsx';
import { ErrorPage } from './error-page.tsx';
import { HomeRedirect } from './home-redirect.tsx';
import { NotFoundPage } from './not-found-page.tsx';

const Opening = () => (
  <div className="page">
    <LoadingLine words="Fetching the page" />
  </div>
);

/** Every page is fetched when it is first opened; the 3D room never loads with the rest. */
export const router = createBrowserRouter([
  {
    ErrorBoundary: ErrorPage,
    HydrateFallback: Opening,
    children: [
      {
        lazy: () => import('@/routes/entrance.tsx'),
        children: [
          { path: '/sign-in', lazy: () => import('@/routes/sign-in.tsx') },
          { path: '/sign-up', lazy: () => import('@/routes/sign-up.tsx') },
          { path: '/reset', lazy: () => import('@/routes/reset.tsx') },
          { path: '/reset/:token', lazy: () => import('@/routes/reset-password.tsx') },
          { path: '/confirm/:token', lazy: () => import('@/routes/confirm.tsx') },
          { path: '/invitation/:token', lazy: () => import('@/routes/invitation.tsx') },
        ],
      },
      { path: '/order/:token', lazy: () => import('@/routes/upholsterer.tsx') },
      {
        lazy: async () => ({ Component: (await import('./shell.tsx')).Shell }),
        ErrorBoundary: ErrorPage,
        children: [
          { path: '/', Component: HomeRedirect },
          { path: '/account', lazy: () => import('@/routes/account.tsx') },
          {
            path: '/w/:workshopId',
            lazy: () => import('@/routes/workshop-layout.tsx'),
            children: [
              {
                ErrorBoundary: ErrorPage,
                children: [
                  { index: true, lazy: () => import('@/routes/productions.tsx') },
                  { path: 'workshop', lazy: () => import('@/routes/workshop.tsx') },
                  {
                    path: 'p/:productionId',
                    lazy: () => import('@/routes/production-layout.tsx'),
                    children: [
                      {
                        ErrorBoundary: ErrorPage,
                        children: [
                          { index: true, lazy: () => import('@/routes/production.tsx') },
                          { path: 'people', lazy: () => import('@/routes/people.tsx') },
                          { path: 'sets/:setId', lazy: () => import('@/routes/room.tsx') },
                          { path: 'orders/:orderId', lazy: () => import('@/routes/order.tsx') },
                          { path: 'sets/:setId/fit', lazy: () => import('@/routes/fit.tsx') },
                          { path: 'sets/:setId/stick', lazy: () => import('@/routes/stick.tsx') },
                          { path: 'sets/:setId/suggest', lazy: () => import('@/routes/suggest.tsx') },
                          { path: 'sets/:setId/crowd', lazy: () => import('@/routes/crowd.tsx') },
                          { path: 'sets/:setId/revisions', lazy: () => import('@/routes/revisions.tsx') },
                          { path: 'sets/:setId/compare', lazy: () => import('@/routes/compare.tsx') },
                        ],
                      },
                    ],
                  },
                ],
              },
            ],
          },
          { path: '*', Component: NotFoundPage },
        ],
      },
    ],
  },
]);
