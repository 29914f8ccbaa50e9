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
      {
        element: <SignedIn />,
        children: [
          {
            element: <Book />,
            errorElement: <PageFailed />,
            children: [
              { path: '/', lazy: () => import('./pages/casebook.tsx') },
              {
                path: '/cases/:number',
                lazy: () => import('./pages/case/case-leaf.tsx'),
                children: [{ index: true, element: <Navigate to="intake" replace /> }],
              },
              { path: '*', element: <NothingHere /> },
            ],
          },
        ],
      },
    ],
  },
]);
