import { registerSW } from 'virtual:pwa-register';
import { createRoot } from 'react-dom/client';

registerSW({});

const root = document.getElementById('root');
if (root)
  createRoot(root).render(
    <main>
      <h1>Lookbell</h1>
    </main>,
  );
