export interface Rectangle {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}
export interface WindowPlace extends Partial<Pick<Rectangle, 'x' | 'y'>> {
  readonly width: number;
  readonly height: number;
  readonly maximised: boolean;
}

/** Enough of the title bar to take hold of. */
const visible = { width: 120, height: 40 };

/** Where the window goes: the last place if a screen still shows it, otherwise a good size in the middle. */
export function windowPlace(
  last: (Rectangle & { readonly maximised: boolean }) | null,
  screens: readonly Rectangle[],
): WindowPlace {
  const main = screens[0] ?? { x: 0, y: 0, width: 1280, height: 800 };
  const fallback = {
    width: Math.min(1360, main.width),
    height: Math.min(880, main.height),
    maximised: last?.maximised ?? false,
  };
  if (last === null) return fallback;
  const shown = screens.some(
    (screen) =>
      Math.min(last.x + last.width, screen.x + screen.width) - Math.max(last.x, screen.x) >= visible.width &&
      last.y >= screen.y - visible.height / 2 &&
      last.y + visible.height <= screen.y + screen.height,
  );
  return shown ? last : fallback;
}
