import { useState } from 'react';
import {
  CautionList,
  CloudStrip,
  Dialog,
  EmptyState,
  ErrorPanel,
  FlagList,
  FlagMark,
  Formula,
  Keys,
  NumberWithRange,
  Progress,
  SearchableSelect,
  SourceNote,
  SpinBar,
  Swatch,
  SwatchTrio,
  TermSymbol,
  TransmissionScale,
  TransmissionStrip,
  UnitSwitch,
  useToast,
  Why,
} from '..';
import {
  bands,
  beyond,
  cautions,
  cloud,
  darkViolet,
  flags,
  paleViolet,
  reasons,
  transmittanceOf,
  violet,
} from './samples';
import { Section } from './Section';

const ligands = [
  { id: 'nh3', label: 'NH3', detail: 'ammine, N donor' },
  { id: 'en', label: 'en', detail: 'ethane-1,2-diamine, two N donors' },
  { id: 'bpy', label: 'bpy', detail: "2,2'-bipyridine, two N donors" },
  { id: 'ox', label: 'ox', detail: 'oxalate, two O donors' },
];

const spin = (probabilityHigh: number | null, words: string) => ({
  ...{ probabilityHigh, words },
  unpairedElectrons: 4,
  nearCrossover: probabilityHigh !== null && Math.abs(probabilityHigh - 0.5) < 0.3,
});

export function PartsPage() {
  const [ligand, setLigand] = useState<string | null>('en');
  const [dialog, setDialog] = useState(false);
  const show = useToast();
  const strengths = [0.004, 0.02, 0.09];
  return (
    <>
      <Section title="Numbers">
        <p>
          <UnitSwitch />
        </p>
        <p>
          10Dq <NumberWithRange kind="interval" value={21_700} sigma={1_750} />, B{' '}
          <NumberWithRange kind="interval" value={725} sigma={65} />, band{' '}
          <NumberWithRange value={17_400} sigma={1_040} />, width{' '}
          <NumberWithRange kind="width" centre={17_400} value={3_600} />, moment{' '}
          <NumberWithRange kind="plain" unit="μB" value={3.87} range={[3.7, 4]} />, ζ{' '}
          <NumberWithRange value={null} />
        </p>
        <Why reasons={reasons} of="10Dq" open />
        <p>
          <SourceNote
            source="C. K. Jørgensen, Modern Aspects of Ligand Field Theory, 1971, p. 347"
            status="page"
          />{' '}
          <SourceNote source="A. B. P. Lever, Inorganic Electronic Spectroscopy, 1984" status="memory" />{' '}
          <SourceNote source={null} status="unknown" />{' '}
          <SourceNote source="set on 3 May by A. N." status="own" />
        </p>
      </Section>
      <Section title="Terms and formulas">
        <p>
          <TermSymbol label="4T2g" />, <TermSymbol label="2Eg" />, <TermSymbol label="3T1g(P)" />,{' '}
          <TermSymbol label="1A1" />, <TermSymbol label="Cl- -> Co (t2g)" />
        </p>
        <p>
          <Formula formula="[Cr(NH3)5Cl]2+" name="pentaamminechloridochromium(III)" />,{' '}
          <Formula formula="[Co(en)2Cl2]+" />, <Formula formula="K3[Fe(CN)6]" />,{' '}
          <Formula formula="[Ni(en)3]Cl2·2H2O" />
        </p>
      </Section>
      <Section title="Colour">
        <div className="gallery-row">
          <Swatch colour={violet} size="large" caption="at the stated strength" />
          <Swatch colour={beyond} />
          <Swatch colour={null} />
          <Swatch colour={violet} size="row" text="words" />
          <Swatch colour={darkViolet} size="row" text="none" />
        </div>
        <SwatchTrio
          strengths={[
            { factor: 1 / 3, colour: paleViolet },
            { factor: 1, colour: violet },
            { factor: 3, colour: darkViolet },
          ]}
          concentration_mM={25}
          path_cm={1}
        />
        <div className="gallery-row">
          <div className="gallery-cell">
            <CloudStrip cloud={cloud} />
          </div>
          <div className="gallery-cell">
            <TransmissionStrip scale transmittance={transmittanceOf(bands, 0.03)} />
          </div>
        </div>
        <table className="gallery-table">
          <thead>
            <tr>
              <th scope="col">Complex</th>
              <th scope="col">
                Transmitted light
                <TransmissionScale />
              </th>
              <th scope="col">Seen</th>
              <th scope="col">Possible</th>
              <th scope="col">Spin</th>
              <th scope="col">Remarks</th>
            </tr>
          </thead>
          <tbody>
            {strengths.map((strength, index) => (
              <tr key={strength}>
                <td>
                  <Formula formula="[Cr(H2O)6]3+" />
                </td>
                <td>
                  <TransmissionStrip transmittance={transmittanceOf(bands, strength)} />
                </td>
                <td>
                  <Swatch colour={[paleViolet, violet, darkViolet][index]!} size="row" text="words" />
                </td>
                <td>
                  <CloudStrip cloud={cloud} compact />
                </td>
                <td>
                  <SpinBar
                    compact
                    spin={spin(
                      [0.97, 0.57, 0.08][index]!,
                      ['high expected', 'cannot say', 'low likely'][index]!,
                    )}
                  />
                </td>
                <td>
                  <FlagMark flags={[flags[index]!]} />
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </Section>
      <Section title="Spin">
        <div className="gallery-row">
          <SpinBar spin={spin(0.57, 'cannot say: high or low spin')} />
          <SpinBar spin={spin(0.995, 'high spin expected')} />
          <SpinBar spin={spin(null, 'one spin only')} />
        </div>
      </Section>
      <Section title="Remarks and cautions">
        <div className="gallery-row">
          <div className="gallery-cell">
            <FlagList flags={flags} />
          </div>
          <div className="gallery-cell">
            <CautionList cautions={cautions} />
          </div>
          <div className="gallery-cell">
            <CautionList cautions={[]} of="nothing on file" />
          </div>
        </div>
      </Section>
      <Section title="Feedback">
        <ErrorPanel
          problems={[
            {
              code: 'coordination-number',
              field: 'ligands.terpy',
              message: 'Three terpy occupy 9 places; an octahedral complex has 6.',
              remedy: 'Take two terpy, or another geometry.',
            },
            { code: 'unknown-metal', field: 'metal', message: '“Xx” is not an element.' },
          ]}
        >
          <button type="button">Back to the entry</button>
        </ErrorPanel>
        <Progress
          label="Estimating candidates"
          done={12_400}
          total={50_000}
          detail="about 4 s left"
          onCancel={() => undefined}
        />
        <Progress label="Reading the file" done={3} total={null} />
        <EmptyState title="No candidates yet" actions={<button type="button">Add a candidate</button>}>
          Choose a metal and its ligands, or let a search propose some.
        </EmptyState>
        <p>
          <button type="button" onClick={() => setDialog(true)}>
            Open dialog
          </button>{' '}
          <button
            type="button"
            onClick={() => show({ message: 'Deleted one candidate', undo: () => undefined })}
          >
            Show toast
          </button>
        </p>
        <Dialog
          open={dialog}
          title="Empty the bin?"
          onClose={() => setDialog(false)}
          actions={
            <>
              <button type="button" onClick={() => setDialog(false)}>
                Keep
              </button>
              <button type="button" onClick={() => setDialog(false)}>
                Empty
              </button>
            </>
          }
        >
          Twelve candidates will be gone for good.
        </Dialog>
      </Section>
      <Section title="Input">
        <div className="gallery-row">
          <div className="gallery-cell">
            <SearchableSelect label="Ligand" options={ligands} value={ligand} onChange={setLigand} />
          </div>
          <div className="gallery-cell">
            <SearchableSelect
              label="Metal"
              options={[]}
              value={null}
              onChange={() => undefined}
              error="Choose a metal."
            />
          </div>
        </div>
        <p>
          <Keys combo="Ctrl+Shift+P" /> <Keys combo="g t" />
        </p>
      </Section>
    </>
  );
}
