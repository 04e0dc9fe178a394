import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import '../styles/app.css';
import { adoptNonce } from './nonce';
import { Providers } from './providers';
import { createRouter } from './router';
import { createQueryClient } from '../lib/api/query-client';

adoptNonce();
const queryClient = createQueryClient();
const router = createRouter(queryClient);

const container = document.getElementById('root');
if (!container) throw new Error('index.html has no element with the id "root"');
createRoot(container).render(
  <StrictMode>
    <Providers queryClient={queryClient}>
      <RouterProvider router={router} />
    </Providers>
  </StrictMode>,
);
