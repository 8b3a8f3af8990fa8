import { createContext, use, useEffect, useMemo, useSyncExternalStore, type ReactNode } from 'react';
import { type Command, CommandRegistry } from './command';
import { listenToKeys } from './keyboard';

const CommandContext = createContext<CommandRegistry>(new CommandRegistry());

interface CommandProviderProps {
  /** Whether single letters act as shortcuts. */
  readonly singleKeys: boolean;
  readonly children: ReactNode;
}

export function CommandProvider({ singleKeys, children }: CommandProviderProps) {
  const registry = useMemo(() => new CommandRegistry(), []);
  useEffect(() => listenToKeys(registry, () => singleKeys), [registry, singleKeys]);
  return <CommandContext value={registry}>{children}</CommandContext>;
}

export const useCommandRegistry = (): CommandRegistry => use(CommandContext);

/** Offers commands as long as the component is on screen. The list should be memoised. */
export function useCommands(commands: readonly Command[]): void {
  const registry = useCommandRegistry();
  useEffect(() => registry.offer({}, commands), [registry, commands]);
}

export function useAllCommands(): readonly Command[] {
  const registry = useCommandRegistry();
  return useSyncExternalStore(registry.subscribe, () => registry.all);
}
