import { type Caution, cautionsFor } from '../../../../core/library/cautions';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import type { Composition } from '../../../../core/record/composition';
import { toCsv } from '../../../../core/record/out/csv';

/** Something that has to be at hand to make the listed complexes. */
export interface OrderLine {
  readonly kind: 'ligand' | 'metal';
  /** `ethane-1,2-diamine`, `a salt or complex of chromium(III)`. */
  readonly what: string;
  /** Abbreviation and formula of a ligand, the ion of a metal. */
  readonly short: string;
  readonly formula: string;
  /** Per formula unit, for each complex: `3 in [Ni(en)3]2+`. */
  readonly uses: readonly { readonly complex: string; readonly count: number }[];
  readonly onShelf: boolean;
}

export interface OrderList {
  readonly lines: readonly OrderLine[];
  readonly cautions: readonly Caution[];
}

export interface Ordered {
  readonly formula: string;
  readonly composition: Composition;
}

const roman = ['0', 'I', 'II', 'III', 'IV', 'V', 'VI', 'VII', 'VIII'];

/** What to have for a list of complexes, each thing once, with the cautions of all of them. */
export function orderList(
  complexes: readonly Ordered[],
  shelf: ReadonlySet<string>,
  library: ParameterLibrary,
): OrderList {
  const lines = new Map<string, OrderLine>();
  const need = (id: string, line: Omit<OrderLine, 'uses'>, complex: string, count: number): void => {
    const { uses } = lines.get(id) ?? { uses: [] };
    lines.set(id, { ...line, uses: [...uses, { complex, count }] });
  };
  for (const { formula, composition } of complexes) {
    const { metal, oxidationState, ligands } = composition;
    const ion = `${metal}(${roman[oxidationState] ?? oxidationState})`;
    need(
      `metal ${ion}`,
      { kind: 'metal', what: `a source of ${ion}`, short: ion, formula: '', onShelf: false },
      formula,
      1,
    );
    for (const [id, count] of Object.entries(ligands)) {
      const ligand = library.ligands.get(id);
      if (ligand === undefined) continue;
      const { commonName, abbreviation } = ligand;
      const line = { what: commonName, short: abbreviation, formula: ligand.formula, onShelf: shelf.has(id) };
      need(`ligand ${id}`, { kind: 'ligand', ...line }, formula, count);
    }
  }
  const cautions = new Map<string, Caution>();
  for (const { composition } of complexes) {
    for (const caution of cautionsFor(composition, null, library)) {
      cautions.set(`${caution.id} ${caution.about}`, caution);
    }
  }
  const order = (line: OrderLine): number => (line.kind === 'metal' ? 0 : line.onShelf ? 2 : 1);
  return {
    lines: [...lines.values()].sort((one, other) => order(one) - order(other)),
    cautions: [...cautions.values()],
  };
}

export const usesText = ({ uses }: OrderLine): string =>
  uses.map(({ complex, count }) => `${count} in ${complex}`).join('; ');

const head = ['Kind', 'What', 'Short', 'Formula as ligand', 'On the shelf', 'Per formula unit'];

/** The list with its cautions, which belong to it: one cannot be had without the other. */
export function orderRows({ lines, cautions }: OrderList, standing: string): (string | null)[][] {
  return [
    head,
    ...lines.map((line) => [
      line.kind,
      line.what,
      line.short,
      line.formula,
      line.onShelf ? 'yes' : 'no',
      usesText(line),
    ]),
    [],
    ['Cautions', standing],
    ...cautions.map(({ about, text, codes, source }) => [
      'caution',
      about,
      text,
      codes.join(' '),
      '',
      source,
    ]),
    ...(cautions.length === 0 ? [['caution', 'none on file: not assessed, not safe']] : []),
  ];
}

export const orderCsv = (list: OrderList, standing: string): string => toCsv(orderRows(list, standing));

/** The same for pasting into a spreadsheet or a letter. */
export const orderText = (list: OrderList, standing: string): string =>
  toCsv(orderRows(list, standing), { delimiter: '\t', decimal: '.' }).replaceAll('\r\n', '\n');
