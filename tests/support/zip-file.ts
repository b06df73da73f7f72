export { zipFile, type ZipFile } from '../../scripts/bench/hostile/zip-file.ts';
