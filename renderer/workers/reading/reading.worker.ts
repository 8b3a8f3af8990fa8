import '../../app/boot/jitless';
import type { ReadingAnswer, ReadingRequest } from './protocol';
import { readFile } from './readFile';

const answer = (message: ReadingAnswer): void => self.postMessage(message);

self.onmessage = ({ data }: MessageEvent<ReadingRequest>) => {
  try {
    answer({ ok: true, value: readFile(data) });
  } catch (error) {
    answer({ ok: false, message: error instanceof Error ? error.message : String(error) });
  }
};
