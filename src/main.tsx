import './app/no-eval.ts';
import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { createQueryClient } from './app/query-client.ts';
import { createRouter } from './app/router.tsx';
import './styles.css';

const root = document.getElementById('root');
if (!root) throw new Error('The page has no #root to draw in');

const client = createQueryClient();
createRoot(root).render(
  <StrictMode>
    <QueryClientProvider client={client}>
      <RouterProvider router={createRouter(client)} />
    </QueryClientProvider>
  </StrictMode>,
);
