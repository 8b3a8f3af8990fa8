/** Every part and plot in its states on one page, for looking at them. Not part of the application's build. */
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { ToastProvider, UnitProvider } from '..';
import '../../app/tokens.css';
import '../../app/base.css';
import './gallery.css';
import { PartsPage } from './PartsPage';
import { PlotsPage } from './PlotsPage';

const theme = new URLSearchParams(location.search).get('theme');
if (theme) document.documentElement.dataset['theme'] = theme;

createRoot(document.getElementById('gallery')!).render(
  <StrictMode>
    <UnitProvider initial="cm-1">
      <ToastProvider>
        <h1>Parts and plots</h1>
        {location.hash === '#plots' ? <PlotsPage /> : <PartsPage />}
      </ToastProvider>
    </UnitProvider>
  </StrictMode>,
);
