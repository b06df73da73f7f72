export { compute } from './compute.ts';
