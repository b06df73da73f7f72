import { createPreviewWork, type Message } from './preview-work.ts';

const work = createPreviewWork();

self.addEventListener('message', ({ data }: MessageEvent<Message>) => {
  self.postMessage(work(data));
});
