/** What befell the files since the numbers were computed: the first that is not as it was, by its place. */
export type FileState =
  { readonly kind: 'as computed' } | { readonly kind: 'changed' | 'edited' | 'gone'; readonly file: number };

export const asComputed: FileState = { kind: 'as computed' };
