/** Words of somebody else in a line, no longer than leaves room for the columns beside. */
export function ShortWords({ words }: { readonly words: string }) {
  return (
    <bdi className="inline-block max-w-[180px] truncate align-middle" title={words}>
      {words}
    </bdi>
  );
}
