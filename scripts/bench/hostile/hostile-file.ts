/** A file that no reader may choke on: how it is made, and what its refusal has to say. */
export type HostileFile = {
  readonly name: string;
  readonly make: () => Buffer | string | Promise<Buffer>;
  readonly says: RegExp;
};
