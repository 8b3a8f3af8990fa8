import { useState, type FormEvent, type ReactNode } from 'react';
import { xUnits, yUnits, type CurveData } from '../../../../core/record/curve';
import type { Conditions } from '../../../../core/record/measurement';
import { treatmentStepSchema, type TreatmentStep } from '../../../../core/record/treatment';
import { Field, readNumber } from '../../../app/form';
import type { Blanks } from './TreatmentPanel';
import { readRanges } from './stepText';

type Op = TreatmentStep['op'];

const opWords: Record<Op, string> = {
  'state units': 'state units',
  'to absorbance': 'to absorbance',
  'to percent transmittance': 'to % transmittance',
  'merge equal x': 'merge points with the same x',
  'leave out': 'leave out a stretch',
  'leave out above': 'leave out above an absorbance',
  'subtract blank': 'subtract a blank',
  'subtract baseline': 'subtract a baseline',
  'subtract scatter': 'subtract scattered light',
  'to molar absorptivity': 'to molar absorptivity',
  smooth: 'smooth what is shown',
  derivative: 'show a derivative',
};
const ops = Object.keys(opWords) as Op[];

interface StepFormProps {
  /** As it stands before the new step. */
  readonly curve: CurveData;
  readonly conditions: Conditions;
  readonly blanks: Blanks;
  readonly onAdd: (step: TreatmentStep) => void;
  readonly onClose: () => void;
}

/** Texts as typed, by name of the field. */
type Draft = Readonly<Record<string, string>>;

const given = (value: { value: number; u: number | null } | null): [string, string] =>
  value === null ? ['', ''] : [String(value.value), value.u === null ? '' : String(value.u)];

function startOf({ concentration_mM, path_cm }: Conditions, blanks: Blanks, curve: CurveData): Draft {
  const [concentration, concentrationU] = given(concentration_mM);
  const [path, pathU] = given(path_cm);
  return {
    xUnit: curve.xUnit,
    yUnit: curve.yUnit,
    keep: 'mean',
    ranges: '',
    why: '',
    absorbance: '2',
    blank: blanks.keys().next().value ?? '',
    form: 'linear',
    exponent: '',
    concentration,
    concentrationU,
    path,
    pathU,
    absorbanceU: '',
    window: '11',
    degree: '3',
    order: '2',
  };
}

/** Null in place of a number that makes none; the schema then names the field. */
const number = (text: string): number | null => readNumber(text);

function stepOf(op: Op, draft: Draft): unknown {
  const smoothing = { window: number(draft.window!), degree: number(draft.degree!) };
  switch (op) {
    case 'state units':
      return { op, xUnit: draft.xUnit, yUnit: draft.yUnit };
    case 'to absorbance':
    case 'to percent transmittance':
      return { op };
    case 'merge equal x':
      return { op, keep: draft.keep };
    case 'leave out':
      return { op, ranges: readRanges(draft.ranges!), why: draft.why!.trim() };
    case 'leave out above':
      return { op, absorbance: number(draft.absorbance!) };
    case 'subtract blank':
      return { op, curveId: draft.blank };
    case 'subtract baseline':
      return { op, form: draft.form, ranges: readRanges(draft.ranges!) };
    case 'subtract scatter':
      return {
        op,
        exponent: draft.exponent!.trim() === '' ? null : number(draft.exponent!),
        ranges: readRanges(draft.ranges!),
      };
    case 'to molar absorptivity':
      return {
        op,
        concentration_mM: { value: number(draft.concentration!), u: uncertainty(draft.concentrationU!) },
        path_cm: { value: number(draft.path!), u: uncertainty(draft.pathU!) },
        absorbance_u: uncertainty(draft.absorbanceU!),
      };
    case 'smooth':
      return { op, ...smoothing };
    case 'derivative':
      return { op, order: number(draft.order!), ...smoothing };
  }
}

const uncertainty = (text: string): number | null => (text.trim() === '' ? null : number(text));

const fieldWords: Record<string, string> = {
  ranges: 'stretches: write them as 300-340, 800-900',
  concentration_mM: 'concentration: a number above zero',
  path_cm: 'path length: a number above zero',
  absorbance: 'absorbance: a number above zero',
  exponent: 'exponent: 0 to 6, or empty',
  window: 'window: an odd number of points, 3 to 501',
  degree: 'degree: 1 to 6',
  curveId: 'blank: choose a spectrum of this project',
};

/** One further step of treatment, with the fields that it needs. */
export function StepForm({ curve, conditions, blanks, onAdd, onClose }: StepFormProps) {
  const [op, setOp] = useState<Op>(suggested(curve));
  const [draft, setDraft] = useState(() => startOf(conditions, blanks, curve));
  const [error, setError] = useState<string | null>(null);
  const set = (name: string) => (value: string) => setDraft((before) => ({ ...before, [name]: value }));
  const unit = curve.xUnit === 'unknown' ? 'units of x' : curve.xUnit === 'nm' ? 'nm' : 'cm⁻¹';
  const text = (name: string, label: string, more?: { unit?: string; hint?: string }): ReactNode => (
    <Field label={label} {...more}>
      {(attributes) => (
        <input
          {...attributes}
          autoComplete="off"
          maxLength={300}
          value={draft[name]}
          onChange={(event) => set(name)(event.currentTarget.value)}
        />
      )}
    </Field>
  );
  const choice = (
    name: string,
    label: string,
    options: readonly (readonly [string, string])[],
  ): ReactNode => (
    <Field label={label}>
      {(attributes) => (
        <select
          {...attributes}
          value={draft[name]}
          onChange={(event) => set(name)(event.currentTarget.value)}
        >
          {options.map(([id, words]) => (
            <option key={id} value={id}>
              {words}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
  const same = (list: readonly string[]): (readonly [string, string])[] => list.map((id) => [id, id]);
  const stretches = text('ranges', 'Stretches', { unit, hint: 'such as 300-340, 800-900' });
  const fields: Partial<Record<Op, ReactNode>> = {
    'state units': (
      <>
        {choice('xUnit', 'x holds', same(xUnits))}
        {choice('yUnit', 'y holds', same(yUnits))}
      </>
    ),
    'merge equal x': choice('keep', 'Keep', same(['mean', 'first', 'last'])),
    'leave out': (
      <>
        {stretches}
        {text('why', 'Why')}
      </>
    ),
    'leave out above': text('absorbance', 'Above absorbance'),
    'subtract blank': choice(
      'blank',
      'Blank',
      Array.from(blanks, ([id, { name }]) => [id, name] as const),
    ),
    'subtract baseline': (
      <>
        {choice('form', 'Form', same(['constant', 'linear', 'quadratic']))}
        {stretches}
      </>
    ),
    'subtract scatter': (
      <>
        {text('exponent', 'Exponent of λ', { hint: 'empty: fitted between 0 and 6' })}
        {stretches}
      </>
    ),
    'to molar absorptivity': (
      <>
        {text('concentration', 'Concentration', { unit: 'mM' })}
        {text('concentrationU', 'its ±', { unit: 'mM' })}
        {text('path', 'Path length', { unit: 'cm' })}
        {text('pathU', 'its ±', { unit: 'cm' })}
        {text('absorbanceU', '± of the absorbance')}
      </>
    ),
    smooth: (
      <>
        {text('window', 'Points')}
        {text('degree', 'Degree')}
      </>
    ),
    derivative: (
      <>
        {choice('order', 'Order', same(['1', '2']))}
        {text('window', 'Points')}
        {text('degree', 'Degree')}
      </>
    ),
  };
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    const checked = treatmentStepSchema.safeParse(stepOf(op, draft));
    if (checked.success) {
      onAdd(checked.data);
      return;
    }
    const place = String(checked.error.issues[0]?.path[0] ?? '');
    setError(`Check ${fieldWords[place] ?? place}.`);
  };
  return (
    <form className="stack" onSubmit={submit} noValidate>
      <div className="analysis-fields">
        <Field label="Step">
          {(attributes) => (
            <select
              {...attributes}
              value={op}
              onChange={(event) => {
                setOp(event.currentTarget.value as Op);
                setError(null);
              }}
            >
              {ops.map((each) => (
                <option key={each} value={each} disabled={each === 'subtract blank' && blanks.size === 0}>
                  {opWords[each]}
                </option>
              ))}
            </select>
          )}
        </Field>
        {fields[op]}
      </div>
      {error !== null && (
        <p className="field-error" role="alert">
          {error}
        </p>
      )}
      <div className="analysis-actions">
        <button type="submit" className="button-main">
          Add the step
        </button>
        <button type="button" onClick={onClose}>
          Cancel
        </button>
      </div>
    </form>
  );
}

/** What most people do next with such a curve. */
function suggested({ xUnit, yUnit }: CurveData): Op {
  if (xUnit === 'unknown' || yUnit === 'unknown') return 'state units';
  if (yUnit === 'transmittance' || yUnit === 'percent-transmittance') return 'to absorbance';
  return yUnit === 'absorbance' ? 'subtract baseline' : 'leave out';
}
