import { useMemo, useState } from 'react';
import { ConfirmDialog } from '../../app/form';
import { useAction, useStored, useStore } from '../../app/services';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState, ErrorPanel, useToast } from '../../parts';
import { counted, keptInBin_days, type Store } from '../../store';
import { binEntries } from './binEntries';
import { BinTable } from './BinTable';

const binContent = (store: Store) => store.bin.content();
const shown = ['projects', 'candidates', 'measurements', 'samples', 'frozenPredictions'] as const;

export default function BinView() {
  const { value: content, error } = useStored(binContent, shown);
  const [asking, setAsking] = useState(false);
  const empty = useEmptyBin();
  const entries = useMemo(() => (content ? binEntries(content) : []), [content]);
  const count = entries.length;
  return (
    <>
      <ViewHeader
        title="Bin"
        summary={`What you delete stays here for ${keptInBin_days} days and then goes for good.`}
        actions={
          count > 0 && (
            <button type="button" className="button-danger" onClick={() => setAsking(true)}>
              Empty the bin…
            </button>
          )
        }
      />
      {error !== null && (
        <ErrorPanel
          title="The bin cannot be read"
          problems={[{ code: 'integrity', field: '', message: error }]}
        />
      )}
      {content && count === 0 && (
        <EmptyState title="The bin is empty">Nothing was deleted lately.</EmptyState>
      )}
      {count > 0 && <BinTable entries={entries} />}
      <ConfirmDialog
        open={asking}
        title="Empty the bin?"
        verb="Delete for good"
        onConfirm={empty}
        onClose={() => setAsking(false)}
      >
        <p>
          {counted(content?.projects.length ?? 0, 'project')} with all they hold,{' '}
          {counted(content?.candidates.length ?? 0, 'candidate')} with their measurements and{' '}
          {counted(content?.records.length ?? 0, 'single record')} would be gone. This cannot be undone.
          Records that measurements elsewhere depend on stay.
        </p>
      </ConfirmDialog>
    </>
  );
}

function useEmptyBin(): () => void {
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  return () =>
    void act(async () => {
      const gone = await store.bin.empty();
      toast({ message: `Deleted ${counted(gone, 'record')} for good` });
    });
}
