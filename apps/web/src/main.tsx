import '@/styles/fonts.css';
import '@/styles/index.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { App } from '@/app/app.tsx';
import { followSystemTheme } from '@/lib/theme.ts';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no element with the id "root".');

followSystemTheme();
createRoot(root).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
