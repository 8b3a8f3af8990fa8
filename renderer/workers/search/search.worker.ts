import '../../app/boot/jitless';
import { defaultLibrary, withParameterSet } from '../../../core/library';
import type { ToSearch } from './protocol';
import { SearchRunner } from './runner';

const runner = new SearchRunner(
  (message) => self.postMessage(message),
  (overlay) => (overlay === null ? defaultLibrary : withParameterSet(defaultLibrary, overlay).library),
);
self.onmessage = ({ data }: MessageEvent<ToSearch>) => runner.handle(data);
