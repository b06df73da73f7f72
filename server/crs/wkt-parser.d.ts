declare module 'wkt-parser' {
  /** What a WKT says, by its keywords; throws where it is none. */
  export default function parse(wkt: string): unknown;
}
