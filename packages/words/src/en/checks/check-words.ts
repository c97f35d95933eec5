/** Words of a check on site: what to do, where the leads go, and why. */
export interface CheckWords {
  /** Verb first, eight words at most. */
  readonly title: string;
  /** At most two short sentences. */
  readonly do: string;
  readonly why: string;
  /** What its number is called on the scale. */
  readonly reading?: string;
  /** Words of its classes. */
  readonly zones: { readonly good: string; readonly marginal?: string; readonly fail: string };
}
