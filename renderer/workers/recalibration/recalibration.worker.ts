import '../../app/boot/jitless';
import { recalibrate } from '../../../core/agreement/recalibration';
import { defaultLibrary, withParameterSet } from '../../../core/library';
import type { RecalibrationAnswer, RecalibrationRequest } from './protocol';

const answer = (message: RecalibrationAnswer): void => self.postMessage(message);

self.onmessage = ({ data: { observations, overlay } }: MessageEvent<RecalibrationRequest>) => {
  try {
    const library = overlay === null ? defaultLibrary : withParameterSet(defaultLibrary, overlay).library;
    const value = recalibrate(
      observations.map((observation) => ({ ...observation, library })),
      { onProgress: (done, of) => answer({ kind: 'progress', done, of }) },
    );
    answer({ kind: 'result', value });
  } catch (error) {
    answer({ kind: 'failed', message: error instanceof Error ? error.message : String(error) });
  }
};
