export interface Lab {
  readonly L: number;
  readonly a: number;
  readonly b: number;
}

/** The colour of light that came through (solution) or back (powder), under a named illuminant and observer. */
export interface SeenColour {
  /** `#rrggbb`, chroma reduced where the colour lies outside sRGB. */
  readonly srgb: string;
  readonly inGamut: boolean;
  /** CIE 1976 L*, a*, b*. */
  readonly lab: readonly [number, number, number];
  readonly XYZ: readonly [number, number, number];
  /** Colour in words, e.g. `pale violet`. */
  readonly words: string;
  readonly illuminant: string;
  readonly observer: string;
}

/** Colours of draws from the uncertainties: what one swatch cannot say. */
export interface ColourCloud {
  readonly draws: readonly SeenColour[];
  /** Words that occur, most frequent first, with their share. */
  readonly words: readonly { readonly words: string; readonly share: number }[];
}
