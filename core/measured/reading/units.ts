import type { XUnit, YUnit } from '../../record/curve';

/** A unit as found, and what x must be multiplied by to come to it. */
export interface XUnitFound {
  readonly unit: XUnit;
  readonly factor: number;
}

const squeeze = (text: string): string =>
  text
    .normalize('NFKC')
    .toLowerCase()
    .replace(/[\s_]+/g, ' ')
    .trim();

/** The unit of the x axis named in a label or a column header; `unknown` where nothing is recognised. */
export function xUnitOf(label: string): XUnitFound {
  const text = squeeze(label).replace(/[−–]/g, '-');
  const is = (pattern: RegExp) => pattern.test(text);
  if (
    is(/cm ?\^? ?\(? ?- ?1|1 ?\/ ?cm|\/ ?cm-1|reciprocal cent|wave ?number|wellenzahl|nombre d'onde|kayser/)
  ) {
    return { unit: 'cm-1', factor: is(/10(\^| )?3 ?cm|\bkk\b|kcm/) ? 1000 : 1 };
  }
  if (is(/micro ?met|\b[µμu]m\b|micron/)) return { unit: 'nm', factor: 1000 };
  if (is(/[åÅ]|angstr/)) return { unit: 'nm', factor: 0.1 };
  if (is(/\bnm\b|\[nm\]|nano ?met|wave ?length|wellenl|longueur d'onde|lambda|^[λ\u03bb]/)) {
    return { unit: 'nm', factor: 1 };
  }
  return { unit: 'unknown', factor: 1 };
}

/** The quantity on the y axis named in a label or a column header; `unknown` where nothing is recognised. */
export function yUnitOf(label: string): YUnit {
  const text = squeeze(label);
  const is = (pattern: RegExp) => pattern.test(text);
  if (
    is(
      /molar (abs|ext)|absorptivity|epsilon|^[εϵ]|extinction coeff|extinktionskoeff|l ?mol-1 ?cm-1|m-1 ?cm-1/,
    )
  ) {
    return 'molar-absorptivity';
  }
  if (is(/reflect|fluoresc|emission|intensity|counts/)) return 'unknown';
  if (is(/% ?t(?:rans|\b)|%t|percent t|t ?[/([]? ?%|transmi.*(%|percent)|transmission \(?%/))
    return 'percent-transmittance';
  if (is(/transmittan|transmission|^t$/)) return 'transmittance';
  if (is(/absorb|absorpt|extin[kc]tion|\babs\b|^a$|^a ?[([/]|^a,|^a\.?u\.?$|optical density|\bod\b|^e$/)) {
    return 'absorbance';
  }
  return 'unknown';
}
