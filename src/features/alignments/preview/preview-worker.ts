import { previewWork, type Case } from './preview-work.ts';

self.addEventListener('message', ({ data }: MessageEvent<Case>) => {
  self.postMessage(previewWork(data));
});
