/** How many entries of a part of the form have an answer; a blank, typed or not, has none. */
export function countKnown(values: object | undefined): number {
  return Object.values(values ?? {}).filter((value) => value !== undefined && value !== null && value !== "")
    .length;
}
