import './theme/fonts.css';
import './theme/base.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { Providers } from './app/providers';
import { createRouter } from './app/router';
import { copyFullPrecision } from './shared/format/copy-full-precision';

const root = document.getElementById('root');
if (!root) throw new Error('The page has no #root to be drawn into.');

copyFullPrecision(document);
createRoot(root).render(
  <StrictMode>
    <Providers>
      <RouterProvider router={createRouter()} />
    </Providers>
  </StrictMode>,
);
