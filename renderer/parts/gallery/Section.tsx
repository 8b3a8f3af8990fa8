import { type ReactNode } from 'react';

export function Section({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <section className="gallery-section" aria-label={title}>
      <h2>{title}</h2>
      {children}
    </section>
  );
}
