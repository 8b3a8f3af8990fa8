const step_ms = 50;
const patience_ms = 3_000;

/**
 * A field saves when one leaves it: leaves the field being edited and waits until nothing on screen is unsaved.
 *
 * @returns what is still unsaved, null where nothing is
 */
export async function leaveField(unsaved: () => string | null): Promise<string | null> {
  if (document.activeElement instanceof HTMLElement) document.activeElement.blur();
  for (let waited = 0; waited < patience_ms && unsaved() !== null; waited += step_ms) {
    await new Promise((resolve) => setTimeout(resolve, step_ms));
  }
  return unsaved();
}
