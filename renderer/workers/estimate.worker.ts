import '../app/boot/jitless';
import { predictorFor } from './engine';
import type { ToWorker } from './protocol';
import { serve } from './serve';

const handle = serve(self, predictorFor);
self.onmessage = ({ data }: MessageEvent<ToWorker>) => handle(data);
