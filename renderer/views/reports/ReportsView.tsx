import { useCallback, useMemo, useRef, useState, type ReactNode } from 'react';
import { complexFormula } from '../../../core/library/complexFormula';
import { type Command, useCommands } from '../../app/commands';
import { Field, NumberField } from '../../app/form';
import { linkTo, useRouter } from '../../app/router/RouterContext';
import { useAction, useServices, useSettings } from '../../app/services';
import { useVersion } from '../../app/session/observable';
import { useProject } from '../../app/session/ProjectSession';
import { useLibrary } from '../../app/session/useLibrary';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState, SearchableSelect, SegmentedChoice, type SelectOption, useToast } from '../../parts';
import { AgreementReport } from './pages/AgreementReport';
import { CandidateCard } from './pages/CandidateCard';
import { ComparisonSheet } from './pages/ComparisonSheet';
import { OrderPage } from './pages/OrderPage';
import { RecordPage } from './pages/RecordPage';
import type { SheetOfPaper } from './paper/Paper';
import { paperSizes, type PaperSize } from './paper/paperSize';
import { standalonePage } from './paper/standalone';
import { mostOf, readReportItem, reportKinds, type ReportItem } from './reportItem';
import './ReportsView.css';

const sizes = Object.keys(paperSizes).map((id) => ({ id: id as PaperSize, label: id }));

/** North America prints on Letter, everybody else on A4. */
const usualSize = (): PaperSize => (/-(US|CA|MX)$/.test(navigator.language) ? 'Letter' : 'A4');

/** One page to hand over: chosen, looked at as it will be printed, printed or saved. */
export default function ReportsView() {
  const { address } = useRouter();
  const { project, rows } = useProject();
  useVersion(rows);
  const { settings, set } = useSettings();
  const options = useCandidateOptions();
  const size = settings.paper ?? usualSize();
  const [by, setBy] = useState(settings.initials);
  const [scale_mmol, setScale] = useState(1);
  const page = useRef<HTMLElement>(null);
  // An address of its own for each choice would take the keyboard away from what is being chosen.
  const [asked, show] = useState<ReportItem>(() => readReportItem(address.item));
  const { kind } = asked;
  const most = mostOf(kind);
  // Without a choice the page shows what is starred, else what was entered first.
  const names = asked.names.length > 0 ? asked.names : firstChoice(options, rows, most);
  const actions = useHandOver(page, size, `${kind} ${project.name}`);
  const sheet: SheetOfPaper = { size, page, by };
  const choose = (id: string): void =>
    show({ kind, names: most === 1 ? [id] : [...names.filter((name) => name !== id), id].slice(-most) });
  return (
    <>
      <div className="report-controls">
        <ViewHeader
          title="Reports"
          summary="One page to hand over. Cautions, ranges, parameters and version always go with it."
          actions={
            <>
              <button type="button" onClick={actions.html}>
                Save as HTML
              </button>
              {actions.canPdf && (
                <button type="button" onClick={actions.pdf}>
                  Save as PDF
                </button>
              )}
              <button type="button" className="button-main" onClick={actions.print}>
                Print…
              </button>
            </>
          }
        />
        <SegmentedChoice
          legend="Kind of page"
          options={reportKinds}
          value={kind}
          onChange={(next) => {
            const room = mostOf(next);
            // What is on the page stays; where several have room, others join it.
            const joined = new Set([...names, ...(names.length < 2 ? firstChoice(options, rows, room) : [])]);
            show({ kind: next, names: [...joined].slice(0, room) });
          }}
        />
        <div className="report-choices">
          {most > 0 && (
            <SearchableSelect
              label={most === 1 ? 'Candidate' : `Add a candidate (at most ${most})`}
              options={options}
              value={most === 1 ? (names[0] ?? null) : null}
              onChange={choose}
              clearAfterChoice={most > 1}
            />
          )}
          {kind === 'order' && (
            <NumberField
              label="Batch of each"
              unit="mmol"
              value={scale_mmol}
              onChange={(value) => value !== null && setScale(value)}
            />
          )}
          <Field label="Handed over by">
            {(attributes) => (
              <input
                {...attributes}
                maxLength={60}
                value={by}
                onChange={(event) => setBy(event.currentTarget.value)}
              />
            )}
          </Field>
          <SegmentedChoice
            legend="Paper"
            legendShown
            options={sizes}
            value={size}
            onChange={(paper) => set('paper', paper)}
          />
        </div>
        {most > 1 && names.length > 0 && (
          <Chosen
            names={names}
            options={options}
            onRemove={(gone) => show({ kind, names: names.filter((name) => name !== gone) })}
          />
        )}
      </div>
      <div className="report-desk">
        <Page item={{ kind, names }} scale_mmol={scale_mmol} sheet={sheet} />
      </div>
    </>
  );
}

function useCandidateOptions(): readonly SelectOption[] {
  const { rows } = useProject();
  const library = useLibrary();
  const version = useVersion(rows);
  return useMemo(
    () =>
      rows.values().map(({ id, composition, name, tags, starred }): SelectOption => ({
        id,
        label: [composition.isomer, complexFormula(composition, library)].filter(Boolean).join('-'),
        detail: [starred ? '★' : '', name, ...tags.map((tag) => `#${tag}`)].filter(Boolean).join(' '),
      })),
    // The rows change in place; their version says so.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [rows, version, library],
  );
}

function firstChoice(
  options: readonly SelectOption[],
  rows: { get(id: string): { readonly starred: boolean } | undefined },
  most: number,
): readonly string[] {
  const starred = options.filter(({ id }) => rows.get(id)?.starred);
  return (starred.length > 0 ? starred : options).slice(0, Math.min(most, 3)).map(({ id }) => id);
}

interface ChosenProps {
  readonly names: readonly string[];
  readonly options: readonly SelectOption[];
  readonly onRemove: (name: string) => void;
}

const Chosen = ({ names, options, onRemove }: ChosenProps) => (
  <ul className="report-chosen" aria-label="On the page">
    {names.map((name) => {
      const label = options.find(({ id }) => id === name)?.label ?? name;
      return (
        <li key={name}>
          {label}
          <button
            type="button"
            className="button-quiet"
            aria-label={`Take ${label} off the page`}
            onClick={() => onRemove(name)}
          >
            ✕
          </button>
        </li>
      );
    })}
  </ul>
);

interface PageProps {
  readonly item: ReportItem;
  readonly scale_mmol: number;
  readonly sheet: SheetOfPaper;
}

function Page({ item: { kind, names }, scale_mmol, sheet }: PageProps): ReactNode {
  const { project, rows } = useProject();
  if (kind === 'agreement') return <AgreementReport sheet={sheet} />;
  if (rows.state === 'reading') return <p className="soft">Opening…</p>;
  if (names.length === 0)
    return (
      <EmptyState
        title="Nothing to put on a page"
        actions={
          <a className="button" href={linkTo({ view: 'entry', project: project.id })}>
            New candidate
          </a>
        }
      >
        Enter a candidate first, or choose another kind of page.
      </EmptyState>
    );
  if (kind === 'comparison') return <ComparisonSheet names={names} sheet={sheet} />;
  if (kind === 'order') return <OrderPage names={names} scale_mmol={scale_mmol} sheet={sheet} />;
  const candidate = rows.get(names[0]!);
  if (!candidate)
    return (
      <EmptyState
        title="This candidate is not here"
        actions={
          <a className="button" href={linkTo({ view: 'bin' })}>
            Look into the bin
          </a>
        }
      >
        It may have been deleted. Choose another one above.
      </EmptyState>
    );
  return kind === 'card' ? (
    <CandidateCard key={candidate.id} candidate={candidate} sheet={sheet} />
  ) : (
    <RecordPage candidate={candidate} sheet={sheet} />
  );
}

/** The ways in which a page leaves the program. */
function useHandOver(page: { readonly current: HTMLElement | null }, size: PaperSize, name: string) {
  const { host } = useServices();
  const act = useAction();
  const toast = useToast();
  const file = name.replace(/[^\p{L}\p{N} -]/gu, '').trim();
  const ready = useCallback((): HTMLElement | null => {
    if (page.current === null) toast({ message: 'There is no page to hand over yet.' });
    return page.current;
  }, [page, toast]);
  const html = useCallback(() => {
    const paper = ready();
    if (paper === null) return;
    void act(async () => {
      const data = standalonePage(name, paper.outerHTML);
      const answer = await host.saveFile({ kind: 'html', suggestedName: `${file}.html`, data });
      if (answer.saved) toast({ message: `Saved as ${answer.name}` });
    });
  }, [ready, act, host, toast, file, name]);
  const print = useCallback(() => {
    if (ready() !== null) void act(() => host.print());
  }, [ready, act, host]);
  const pdf = useCallback(() => {
    if (ready() === null) return;
    void act(async () => {
      const answer = await host.printToPdf({
        suggestedName: `${file}.pdf`,
        pageSize: size,
        landscape: false,
      });
      if (answer.saved) toast({ message: `Saved as ${answer.name}` });
    });
  }, [ready, act, host, toast, file, size]);
  useCommands(
    useMemo(
      (): readonly Command[] => [
        { id: 'reports.html', label: 'Save the page as HTML', group: 'Reports', keys: ['w'], run: html },
      ],
      [html],
    ),
  );
  return { html, print, pdf, canPdf: host.info.abilities.pdf };
}
