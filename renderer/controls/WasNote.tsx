/** What the entry is in the formulation this one was copied from. */
export function WasNote({ was }: { readonly was: string | null | undefined }) {
  return was == null ? null : <span class="field-was">was {was}</span>;
}
