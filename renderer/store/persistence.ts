export interface StorageState {
  /** Whether the system promised not to clear the data when space runs short; null where it cannot be asked. */
  readonly persisted: boolean | null;
  readonly used_bytes: number | null;
  readonly allowed_bytes: number | null;
}

/** Asks for lasting storage once and says what the system answered. */
export async function askForLastingStorage(
  storage: StorageManager | undefined = navigator.storage,
): Promise<StorageState> {
  if (!storage) return { persisted: null, used_bytes: null, allowed_bytes: null };
  const persisted = await storage
    .persisted()
    .then((already) => already || storage.persist())
    .catch(() => null);
  const { usage = null, quota = null } = await storage.estimate().catch((): StorageEstimate => ({}));
  return { persisted, used_bytes: usage, allowed_bytes: quota };
}
