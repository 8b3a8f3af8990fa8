import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../../../core/library';
import type { Candidate } from '../../../../core/record/project';
import { blankCandidate } from '../../../store';
import { tableText } from '../selection/tableText';
import type { TableRow } from '../tableRow';
import { readPastedTable } from './pastedTable';

const candidate = (id: string, change: Partial<Candidate>): Candidate => ({
  ...blankCandidate,
  id,
  revision: 0,
  createdAt: '2026-03-01T09:00:00Z',
  updatedAt: '2026-03-01T09:00:00Z',
  deletedAt: null,
  projectId: 'p',
  composition: { metal: 'Cr', oxidationState: 3, geometry: 'octahedral', ligands: { nh3: 6 } },
  ...change,
});
const present = [
  candidate('a', { name: 'first', tags: ['shelf', 'blue'], notes: 'two\nlines' }),
  candidate('b', {
    composition: {
      metal: 'Co',
      oxidationState: 3,
      geometry: 'octahedral',
      ligands: { en: 2, cl: 2 },
      isomer: 'trans',
    },
    notes: '=not a formula',
  }),
];
const copied = (): string =>
  tableText(
    present.map((each) => ({ candidate: each, summary: undefined, distance: null }) as unknown as TableRow),
  );
const kinds = (text: string) => readPastedTable(text, present, defaultLibrary).map(({ kind }) => kind);

describe('a pasted table', () => {
  it('that was copied here changes nothing', () => {
    expect(kinds(copied())).toEqual(['same', 'same']);
  });

  it('changes what was changed in the spreadsheet, and nothing else', () => {
    const [line] = readPastedTable(copied().replace('\tfirst\t', '\trenamed\t'), present, defaultLibrary);
    expect(line).toMatchObject({ kind: 'changed', candidate: { id: 'a' }, fields: { name: 'renamed' } });
  });

  it('is a list of formulas where it has no head, each with a name', () => {
    const lines = readPastedTable(
      '[Fe(bpy)3]2+\tred one\n\n[Cr(NH3)6]3+\n[Xy(NH3)6]',
      present,
      defaultLibrary,
    );
    expect(lines[0]).toMatchObject({
      kind: 'new',
      candidate: { name: 'red one', composition: { metal: 'Fe' } },
    });
    expect(lines[1]).toMatchObject({ kind: 'same' });
    expect(lines[2]).toMatchObject({ kind: 'wrong', line: 4, problem: { field: 'formula' } });
  });

  it('names the line of a set that cannot be', () => {
    expect(
      readPastedTable('metal\tligands\tgeometry\nCr\t9 nh3\toctahedral', [], defaultLibrary),
    ).toMatchObject([{ kind: 'wrong', line: 2 }]);
  });
});
