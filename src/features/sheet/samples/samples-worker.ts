import { workSamples, type SamplesAsked } from './work-samples.ts';

self.addEventListener('message', ({ data }: MessageEvent<SamplesAsked>) => {
  self.postMessage(workSamples(data));
});
