import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { queryClient } from './http/query-client.ts';
import { router } from './router.tsx';
import './theme/app.css';
import { applyTheme } from './theme/theme.ts';

applyTheme();
const root = document.getElementById('root');
if (!root) throw new Error('the page has no root to draw in');
createRoot(root).render(
  <StrictMode>
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  </StrictMode>,
);
