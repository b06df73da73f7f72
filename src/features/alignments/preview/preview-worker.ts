import { createPreviewWork, type Asked } from './preview-work.ts';

const work = createPreviewWork();

self.addEventListener('message', ({ data }: MessageEvent<Asked>) => {
  self.postMessage(work(data));
});
