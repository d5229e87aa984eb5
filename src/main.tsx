import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { App } from '#src/app/app.js';
import { startI18n } from '#src/lib/i18n.js';
import { startTheme } from '#src/lib/theme.js';
import './styles/main.css';

startTheme();
await startI18n();

const root = document.getElementById('root');
if (root === null) throw new Error('index.html has no #root');
createRoot(root).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
