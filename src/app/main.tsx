import '@fontsource-variable/atkinson-hyperlegible-next/wght.css';
import '../ui/tokens.css';
import '../ui/base.css';
import { createRoot } from 'react-dom/client';
import { openLookbell } from './openLookbell.tsx';

const root = document.getElementById('root');
if (root !== null) void openLookbell(createRoot(root));
