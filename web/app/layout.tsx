import '@fontsource-variable/archivo/wdth.css';
import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { OriginTip } from '@/parts/origin-tip';
import { Providers } from '@/parts/providers';
import { TopBar } from '@/parts/top-bar';
import './tokens.css';
import './sheet.css';
import './controls.css';
import './tables.css';
import './marks.css';
import './working.css';
import './media.css';

export const metadata: Metadata = {
  title: 'Groundward',
  description: 'Lateral design of whole buildings: from every diaphragm to the foundation.',
};

export const viewport: Viewport = { width: 'device-width', initialScale: 1 };

// Before the first paint, so that a dark sheet never flashes white.
const THEME = `try{const t=localStorage.getItem('theme');if(t==='light'||t==='dark')document.documentElement.dataset.theme=t}catch{}`;

export default function Layout({ children }: { readonly children: ReactNode }) {
  return (
    <html lang="en" suppressHydrationWarning>
      <head>
        <script dangerouslySetInnerHTML={{ __html: THEME }} />
      </head>
      <body>
        <Providers>
          <TopBar />
          {children}
          <footer>
            Results support the judgement of a licensed engineer and never replace it; local codes and licensed practice
            govern. Senses: + along the load case’s direction, − against it; a wall’s shear is positive along its axis,
            first point to second.
          </footer>
          <OriginTip />
        </Providers>
      </body>
    </html>
  );
}
