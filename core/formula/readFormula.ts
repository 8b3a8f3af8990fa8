import { defaultLibrary, type ParameterLibrary } from '../library';
import { dElectronCount, findMetal } from '../library/elements';
import { looksLikeName, readName } from './chemicalName';
import { readCharge } from './charge';
import { type Entity, readEntity } from './coordinationEntity';
import { likelyGeometry } from './likelyGeometry';
import { readOuterIons } from './outerSphere';
import { plainText } from './plainText';
import { type FormulaReading, type ReadFormula, Unreadable } from './types';

const isomerPrefix = /^(cis|trans|fac|mer)\s*-\s*/i;

/** No formula of one complex is longer. */
const longest = 400;

/**
 * Reads one complex as chemists write it: `[Co(en)2Cl2]+`, `K3[Fe(CN)6]`, `trans-[CrCl2(NH3)4]Cl·2H2O`, `CoCl4^2-`,
 * `hexaamminecobalt(III) chloride`, with sub- and superscripts or without. What is not written is taken for granted and
 * said so; a text that makes no sense is answered with the place where it stops doing so.
 */
export function readFormula(typed: string, library: ParameterLibrary = defaultLibrary): FormulaReading {
  const { text, places } = plainText(typed.slice(0, longest));
  try {
    if (text.trim() === '') throw new Unreadable(0, 'Nothing is written');
    return { ok: true, value: looksLikeName(text) ? fromName(text, library) : fromFormula(text, library) };
  } catch (error) {
    if (!(error instanceof Unreadable)) throw error;
    const { at, message, suggestions } = error;
    return { ok: false, problem: { at: places[Math.min(at, text.length)] ?? 0, message, suggestions } };
  }
}

function fromName(text: string, library: ParameterLibrary): ReadFormula {
  const lead = isomerPrefix.exec(text);
  const { rest, oxidationState, ...entity } = readName(text.slice(lead?.[0].length ?? 0), library);
  const outer = rest.replace(/\b(ion|cation|anion)\b/gi, '').trim();
  return whole(entity, oxidationState, {
    isomer: lead?.[1]?.toLowerCase() ?? null,
    counterIon: outer === '' ? null : outer,
    solvate: null,
    assumed: [],
    library,
    at: 0,
  });
}

function fromFormula(text: string, library: ParameterLibrary): ReadFormula {
  const start = /^\s*/.exec(text)![0].length;
  const lead = isomerPrefix.exec(text.slice(start));
  const from = start + (lead?.[0].length ?? 0);
  const open = text.indexOf('[', from);
  const { entity, before, after } =
    open < 0 ? unbracketed(text, from, library) : bracketed(text, from, open, library);
  const stated = readCharge(text, after);
  const outer = readOuterIons(text, after + (stated?.length ?? 0), text.length);
  const solvate = /^\s*·\s*(.+?)\s*$/.exec(text.slice(outer.end))?.[1] ?? null;
  const balance = before.charge + outer.charge;
  const assumed: string[] = [];
  const hasOuter = before.text !== null || outer.text !== null;
  if (stated !== null && hasOuter && stated.charge !== -balance) {
    throw new Unreadable(
      after,
      `The charge ${stated.charge} does not balance the counter-ions, which need ${-balance}`,
    );
  }
  const charge = stated?.charge ?? -balance;
  if (stated === null && !hasOuter) assumed.push('No charge is written: taken as neutral.');
  const ligandCharge = Object.entries(entity.ligands).reduce(
    (sum, [id, times]) => sum + times * (library.ligands.get(id)?.charge ?? 0),
    0,
  );
  return whole(entity, charge - ligandCharge, {
    isomer: lead?.[1]?.toLowerCase() ?? null,
    counterIon: [before.text, outer.text].filter(Boolean).join(', ') || null,
    solvate: solvate === null ? null : solvate.replace(/^(\d+(?:\.\d+)?)\s*(?=[A-Z])/, '$1 '),
    assumed,
    library,
    at: after,
  });
}

interface Inner {
  readonly entity: Entity;
  readonly before: { readonly charge: number; readonly text: string | null };
  /** Where the charge may stand. */
  readonly after: number;
}

function bracketed(text: string, from: number, open: number, library: ParameterLibrary): Inner {
  let depth = 0;
  for (let place = open; place < text.length; place++) {
    if (text[place] === '[') depth += 1;
    if (text[place] === ']') depth -= 1;
    if (depth > 0) continue;
    const before = readOuterIons(text, from, open);
    return { entity: readEntity(text, open + 1, place, library), before, after: place + 1 };
  }
  throw new Unreadable(open, 'This bracket is not closed');
}

function unbracketed(text: string, from: number, library: ParameterLibrary): Inner {
  // A charge at the end needs its sign apart from the last count: `CoCl4^2-`, `CoCl4 2-`, `CoCl4(2-)`.
  const tail =
    /(\^\(?(?:\d*[+-]|[+-]\d*)\)?|\s+\(?(?:\d*[+-]|[+-]\d+)\)?|\((?:\d+[+-]|[+-]\d*)\)|[+-]+)\s*$/.exec(text);
  const end = tail === null ? text.trimEnd().length : tail.index;
  return {
    entity: readEntity(text, from, end, library),
    before: { charge: 0, text: null },
    after: end,
  };
}

interface Rest {
  readonly isomer: string | null;
  readonly counterIon: string | null;
  readonly solvate: string | null;
  readonly assumed: readonly string[];
  readonly library: ParameterLibrary;
  /** Place that a wrong charge is blamed on. */
  readonly at: number;
}

function whole(entity: Entity, oxidationState: number, rest: Rest): ReadFormula {
  const { library, isomer, counterIon, solvate, at } = rest;
  const metal = findMetal(entity.metal)!;
  const [low, high] = metal.oxidationStates;
  if (oxidationState < low || oxidationState > high || dElectronCount(metal, oxidationState) < 0) {
    throw new Unreadable(
      at,
      `This charge makes the oxidation state of ${metal.name} ${oxidationState}, which it never has`,
      [],
    );
  }
  const geometry = likelyGeometry(entity.metal, oxidationState, entity.ligands, library);
  if (geometry === null) throw new Unreadable(at, 'So many donors fit around no metal');
  const charge = Object.entries(entity.ligands).reduce(
    (sum, [id, times]) => sum + times * (library.ligands.get(id)?.charge ?? 0),
    oxidationState,
  );
  const assumed = [...rest.assumed];
  if (geometry !== 'octahedral')
    assumed.push(`Taken as ${geometry.replaceAll('-', ' ')}: the formula does not say it.`);
  return {
    composition: { metal: entity.metal, oxidationState, geometry, ligands: entity.ligands, isomer },
    charge,
    counterIon,
    solvate,
    assumed,
  };
}
