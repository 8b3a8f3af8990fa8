import type { ComponentType } from 'react';
import type { CommandId } from '../host';

/**
 * One task that a chemist would name. A view is a folder in `renderer/views` that exports one of these, and one line in
 * `renderer/views/registry.ts`.
 */
export interface ViewDefinition {
  /** Part of the address: never changed once shipped. */
  readonly id: string;
  /** In the navigation and as title of the window. */
  readonly title: string;
  /** `project`: drawn only while a project is open, which `useProject()` then gives. */
  readonly place: 'workbench' | 'project';
  /** Position in the navigation; null for a view that is reached from others only. */
  readonly order: number | null;
  /** View whose navigation entry is marked while this one shows a record, or has no entry of its own. */
  readonly under?: string;
  /** Command of the menu that leads here. */
  readonly command?: CommandId;
  /** Keys that lead here, beside those of the menu: `g c`. */
  readonly keys?: string;
  /** What one does here, for the command search. */
  readonly hint: string;
  /** Usually `lazy(() => import('./XView'))`. */
  readonly component: ComponentType;
  /** Fetches the code ahead of time, for views that must open in a blink: the same `import('./XView')`. */
  readonly preload?: () => Promise<unknown>;
}

export const defineView = (view: ViewDefinition): ViewDefinition => view;
