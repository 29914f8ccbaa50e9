import { createBrowserRouter, Navigate } from 'react-router-dom';
import { Book } from './pages/book.tsx';
import { SignedIn } from './pages/signed-in.tsx';
import { NothingHere } from './pages/nothing-here.tsx';
import { PageFailed } from './pages/page-failed.tsx';

/**
 * The places of the book. Each page comes in its own file, fetched when first opened, so that the way to the Casebook
 * carries neither the bench nor the editor.
 */
export const router = createBrowserRouter([
  {
    errorElement: <PageFailed />,
    children: [
      { path: '/sign-in', lazy: () => import('./pages/sign-in.tsx') },
      { path: '/invitation/:token', lazy: () => import('./pages/invitation.tsx') },
      { path: '/password', lazy: () => import('./pages/ask-password.tsx') },
      { path: '/password/:token', lazy: () => import('./pages/new-password.tsx') },
      {
        element: <SignedIn />,
        children: [
          {
            path: '/cases/:number/fractographs/:fractographId',
            errorElement: <PageFailed />,
            lazy: () => import('./pages/case/bench.tsx'),
          },
          {
            element: <Book />,
            errorElement: <PageFailed />,
            children: [
              { path: '/', lazy: () => import('./pages/casebook.tsx') },
              { path: '/cases/new', lazy: () => import('./pages/open-a-case.tsx') },
              {
                path: '/cases/:number',
                lazy: () => import('./pages/case/case-leaf.tsx'),
                children: [
                  { index: true, element: <Navigate to="intake" replace /> },
                  { path: 'intake', lazy: () => import('./pages/case/intake.tsx') },
                  { path: 'evidence', lazy: () => import('./pages/case/evidence.tsx') },
                  { path: 'fractographs', lazy: () => import('./pages/case/fractographs.tsx') },
                  { path: 'estimates', lazy: () => import('./pages/case/estimates.tsx') },
                  { path: 'findings', lazy: () => import('./pages/case/findings.tsx') },
                  { path: 'review', lazy: () => import('./pages/case/review.tsx') },
                ],
              },
              { path: '/materials', lazy: () => import('./pages/materials/materials.tsx') },
              { path: '/materials/:materialId', lazy: () => import('./pages/materials/material.tsx') },
              { path: '/me', lazy: () => import('./pages/me.tsx') },
              {
                path: '/laboratory',
                lazy: () => import('./pages/laboratory/laboratory-leaf.tsx'),
                children: [
                  { index: true, element: <Navigate to="people" replace /> },
                  { path: 'people', lazy: () => import('./pages/laboratory/people.tsx') },
                  { path: 'instruments', lazy: () => import('./pages/laboratory/instruments.tsx') },
                  { path: 'mail', lazy: () => import('./pages/laboratory/mail.tsx') },
                  { path: 'trail', lazy: () => import('./pages/laboratory/trail.tsx') },
                ],
              },
              { path: '*', element: <NothingHere /> },
            ],
          },
        ],
      },
    ],
  },
]);
