import './styles.css';
import '../components/components.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { makeQueryClient } from '../lib/query-client';
import { Providers } from './providers';
import { router } from './router';

const root = document.getElementById('root');
if (!root) throw new Error('the page has no root element');

createRoot(root).render(
  <StrictMode>
    <Providers client={makeQueryClient()}>
      <RouterProvider router={router} />
    </Providers>
  </StrictMode>,
);
