import '../../app/boot/jitless';
import { compareCounts } from '../../../core/measured/bandFit/compareCounts';
import { fitBands } from '../../../core/measured/bandFit/fitBands';
import { fitField } from '../../../core/measured/fieldFit/fitField';
import { SpinhueError } from '../../../core/errors';
import type { FittingAnswer, FittingRequest } from './protocol';

const answer = (message: FittingAnswer): void => self.postMessage(message);

function run(asked: FittingRequest) {
  switch (asked.kind) {
    case 'bands':
      return fitBands(asked.request);
    case 'counts':
      return compareCounts(asked.request, asked.most);
    case 'field':
      return fitField(asked.request);
  }
}

self.onmessage = ({ data }: MessageEvent<FittingRequest>) => {
  try {
    answer({ ok: true, value: run(data) });
  } catch (error) {
    answer({
      ok: false,
      message: error instanceof Error ? error.message : String(error),
      remedy: error instanceof SpinhueError ? (error.remedy ?? null) : null,
    });
  }
};
