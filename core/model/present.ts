/**
 * Objects whose absent figures are absent keys, never undefined ones: `'esr' in capacitor` then means what it says.
 */
export function present<T extends object>(
  figures: { readonly [K in keyof T]: T[K] | undefined },
): {
  readonly [K in keyof T]?: Exclude<T[K], undefined>;
} {
  return Object.fromEntries(Object.entries(figures).filter(([, value]) => value !== undefined)) as {
    readonly [K in keyof T]?: Exclude<T[K], undefined>;
  };
}
