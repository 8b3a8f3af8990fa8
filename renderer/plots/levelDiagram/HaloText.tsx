import { type ReactNode, type SVGProps } from 'react';

/**
 * Text that stays legible over lines: drawn twice, since the halo of a later piece would cover the end of an earlier
 * one.
 */
export function HaloText({
  className,
  children,
  ...place
}: SVGProps<SVGTextElement> & { readonly children: ReactNode }) {
  return (
    <>
      <text {...place} className={`${className} halo`}>
        {children}
      </text>
      <text {...place} className={className}>
        {children}
      </text>
    </>
  );
}
