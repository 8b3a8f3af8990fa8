import { bytesOfFile } from '../../../core/record/file';
import type { MeasurementContent } from '../../../core/record/measurement';
import { useAction, useServices, useStore } from '../../app/services';
import { useToast } from '../../parts';
import { StoreError } from '../../store';

/** Raw file and attachments of a measurement, each saved again byte for byte. */
export function FileLinks({ content }: { readonly content: MeasurementContent }) {
  const store = useStore();
  const { host } = useServices();
  const act = useAction();
  const toast = useToast();
  const source = content.kind === 'spectrum' ? content.source : null;
  const files = [
    ...(source === null ? [] : [{ name: source.fileName, fileId: source.fileId, what: 'raw file' }]),
    ...content.attachments.map((each) => ({ ...each, what: 'attachment' })),
  ];
  if (files.length === 0) return null;
  const save = (name: string, id: string): void =>
    void act(async () => {
      const file = await store.measurements.file(id);
      const bytes = file === undefined ? 'missing' : bytesOfFile(file);
      if (bytes === 'missing')
        throw new StoreError(
          'not-found',
          `The bytes of ${name} did not travel with the project.`,
          'Attach the file again, or restore a snapshot.',
        );
      if (bytes === 'damaged')
        throw new StoreError(
          'storage-failed',
          `The bytes of ${name} no longer fit their hash.`,
          'Restore a snapshot, or attach the file again.',
        );
      const answer = await host.saveFile({ kind: 'any', suggestedName: name, data: bytes });
      if (answer.saved) toast({ message: `Saved as ${answer.name}, as it was` });
    });
  return (
    <p className="record-files">
      {files.map(({ name, fileId, what }) => (
        <button
          key={`${fileId} ${what}`}
          type="button"
          className="button-quiet"
          title={`SHA-256 ${fileId}`}
          onClick={() => save(name, fileId)}
        >
          Save {what} {name}
        </button>
      ))}
    </p>
  );
}
