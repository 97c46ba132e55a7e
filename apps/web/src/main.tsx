import '@/styles/fonts.css';
import '@/styles/index.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { App } from '@/app/app.tsx';
import { reloadWhenPartsAreMissing } from '@/lib/newer-version.ts';
import { followSystemTheme } from '@/lib/theme.ts';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no element with the id "root".');

reloadWhenPartsAreMissing();
followSystemTheme();
createRoot(root).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
