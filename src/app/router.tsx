import { createBrowserRouter, Navigate } from 'react-router-dom'
import { RootLayout, SignedInLayout } from './layout'
import { paths } from './paths'
import { PageFault } from './page-fault'

/** Every screen loads its own code when it is first gone to. */
export const router = createBrowserRouter([
  {
    Component: RootLayout,
    HydrateFallback: () => null,
    ErrorBoundary: PageFault,
    children: [
      { path: paths.signIn, lazy: () => import('./routes/sign-in') },
      { path: paths.register, lazy: () => import('./routes/register') },
      { path: paths.invite(':token'), lazy: () => import('./routes/invite') },
      {
        Component: SignedInLayout,
        children: [
          {
            ErrorBoundary: PageFault,
            children: [
              { index: true, element: <Navigate to={paths.jobs} replace /> },
              { path: paths.jobs, lazy: () => import('./routes/jobs') },
              { path: paths.newJob, lazy: () => import('./routes/job-new') },
              { path: paths.job(':jobId'), lazy: () => import('./routes/job') },
              {
                path: paths.survey(':surveyId'),
                lazy: () => import('./routes/survey'),
                handle: { fullBleed: true },
              },
              { path: paths.surveyTable(':surveyId'), lazy: () => import('./routes/survey-table') },
              { path: paths.surveyHistory(':surveyId'), lazy: () => import('./routes/survey-history') },
              { path: paths.findings(':surveyId'), lazy: () => import('./routes/findings') },
              { path: paths.checks(':surveyId'), lazy: () => import('./routes/checks') },
              { path: paths.cutList(':surveyId'), lazy: () => import('./routes/cut-list') },
              { path: '/surveys/:surveyId/cut-list/:run/:cable', lazy: () => import('./routes/working') },
              { path: paths.hardware, lazy: () => import('./routes/hardware') },
              { path: paths.newFitting, lazy: () => import('./routes/fitting') },
              { path: paths.fitting(':key'), lazy: () => import('./routes/fitting') },
              { path: paths.newCable, lazy: () => import('./routes/cable') },
              { path: paths.cable(':key'), lazy: () => import('./routes/cable') },
              { path: paths.houseRules, lazy: () => import('./routes/house-rules') },
              { path: paths.guardRules, lazy: () => import('./routes/guard-rules') },
              { path: '/guard-rules/new', lazy: () => import('./routes/guard-rules-new') },
              { path: paths.guardRulesOf(':id'), lazy: () => import('./routes/guard-rules-of') },
              { path: paths.people, lazy: () => import('./routes/people') },
              { path: paths.company, lazy: () => import('./routes/company') },
              { path: paths.account, lazy: () => import('./routes/account') },
            ],
          },
        ],
      },
      // Every part on one page, while they are made; a build leaves it out.
      ...(import.meta.env.DEV ? [{ path: '/look', lazy: () => import('./look/look-page') }] : []),
      { path: '*', lazy: () => import('./routes/not-found') },
    ],
  },
])
