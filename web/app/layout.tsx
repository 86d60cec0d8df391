import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { Providers } from '@/parts/providers';
import { TopBar } from '@/parts/top-bar';
import './tokens.css';
import './sheet.css';

export const metadata: Metadata = {
  title: 'Groundward',
  description: 'Lateral design of whole buildings: from every diaphragm to the foundation.',
};

export const viewport: Viewport = { width: 'device-width', initialScale: 1 };

export default function Layout({ children }: { readonly children: ReactNode }) {
  return (
    <html lang="en">
      <body>
        <Providers>
          <TopBar />
          {children}
          <footer>
            Results support the judgement of a licensed engineer and never replace it; local codes and licensed practice
            govern. Senses: + along the load case’s direction, − against it; a wall’s shear is positive along its axis,
            first point to second.
          </footer>
        </Providers>
      </body>
    </html>
  );
}
