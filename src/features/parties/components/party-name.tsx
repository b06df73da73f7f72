/** A name in its own direction of writing, which turns nothing beside it round. */
export function PartyName({ name }: { readonly name: string }) {
  return <bdi className="wrap-anywhere">{name === '' ? 'Erased' : name}</bdi>;
}
