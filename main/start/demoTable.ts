import { rankTable } from './rankTable';

/** The demo project, predicted and ranked, as text. */
export function demoTable(): string {
  return rankTable('Demo', []);
}
