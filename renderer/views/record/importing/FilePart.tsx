import { useMemo } from 'react';
import { inWavenumber } from '../../../../core/measured/treatment/wavenumber';
import type { YUnit } from '../../../../core/record/curve';
import type { DelimitedChoices } from '../../../../core/measured/delimited/read';
import { ErrorPanel } from '../../../parts';
import { SpectrumPlot, type SpectrumCurve } from '../../../plots';
import type { StatedUnits } from '../../../workers/reading/protocol';
import { foundIn, openQuestion } from './chosenSpectra';
import { FileChoices, xWords, yWords } from './FileChoices';
import type { ReadFile } from './useReadings';

interface FilePartProps {
  readonly file: ReadFile;
  /** Says that the same bytes lie in the record already. */
  readonly known: string | null;
  readonly isChosen: (index: number) => boolean;
  readonly onToggle: (index: number) => void;
  readonly onChoose: (choices: DelimitedChoices, units: StatedUnits) => void;
}

/** One file of an import: how it was understood, what it holds, what is odd about it. */
export function FilePart({ file, known, isChosen, onToggle, onChoose }: FilePartProps) {
  const { name, result, broke } = file;
  const reading = result?.reading;
  const found = useMemo(() => foundIn([file]), [file]);
  const curves = useMemo(
    () =>
      found
        .filter((_, index) => isChosen(index))
        .flatMap(({ spectrum, index }) => {
          const curve = plotted(inWavenumber(spectrum));
          return curve === null ? [] : [{ ...curve, name: spectrum.name ?? `spectrum ${index + 1}` }];
        }),
    [found, isChosen],
  );
  return (
    <section className="record-file stack" aria-label={name}>
      <h3>{name}</h3>
      {known !== null && <p className="record-notice">{known}</p>}
      {broke !== null && (
        <ErrorPanel
          title="Not read"
          problems={[
            { code: 'integrity', field: '', message: broke, remedy: 'The file itself is untouched.' },
          ]}
        />
      )}
      {broke === null && !reading && <p className="soft">Reading…</p>}
      {reading?.error && (
        <ErrorPanel
          title="This file is refused"
          problems={[
            {
              code: 'integrity',
              field: '',
              message: reading.error.message,
              remedy: 'Correct the choices below or export the spectrum again; nothing was taken over.',
            },
          ]}
        />
      )}
      {reading && <FileChoices file={file} onChoose={onChoose} />}
      {reading && reading.warnings.length > 0 && (
        <ul className="record-warnings">
          {reading.warnings.map(({ message }, index) => (
            <li key={index}>{message}</li>
          ))}
        </ul>
      )}
      {reading?.assumptions && reading.assumptions.length > 0 && (
        <p className="soft small">Taken for granted: {reading.assumptions.join('; ')}.</p>
      )}
      {found.map((each, index) => (
        <label key={each.key} className="check">
          <input type="checkbox" checked={isChosen(index)} onChange={() => onToggle(index)} />
          <span>
            {each.spectrum.name ?? `spectrum ${index + 1}`}: {each.spectrum.x.length} points,{' '}
            {xWords[each.spectrum.xUnit]}, {yWords[each.spectrum.yUnit]}
            {openQuestion(each) !== null && <strong className="record-open"> {openQuestion(each)}</strong>}
          </span>
        </label>
      ))}
      {curves.length > 0 && (
        <SpectrumPlot
          title={`What ${name} holds`}
          predicted={null}
          measured={curves}
          height={240}
          yLabel={axisWords(found.find((_, index) => isChosen(index))!.spectrum.yUnit)}
        />
      )}
    </section>
  );
}

const axisWords = (unit: YUnit): string => (unit === 'unknown' ? 'y as it stands in the file' : yWords[unit]);

/** Points that have a value; a plot has no room for gaps. */
function plotted(curve: ReturnType<typeof inWavenumber>): SpectrumCurve | null {
  if (curve === null) return null;
  const kept = curve.wavenumber_cm1.flatMap((at, index) => {
    const value = curve.y[index];
    return value === null || value === undefined ? [] : [{ at, value }];
  });
  return kept.length < 2
    ? null
    : { wavenumber_cm1: kept.map(({ at }) => at), value: kept.map(({ value }) => value) };
}
