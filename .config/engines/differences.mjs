// Where two engines' reports differ.

/** The blocks of values and the searches whose fingerprints differ, at most `most` of each kind by name. */
export function differences(a, b, most = 5) {
  return ["values", "searches"].flatMap((kind) => {
    const names = new Set([...Object.keys(a[kind].prints), ...Object.keys(b[kind].prints)]);
    const unlike = [...names].filter((name) => a[kind].prints[name] !== b[kind].prints[name]);
    const rest = unlike.length > most ? [`${unlike.length - most} more of the ${kind}`] : [];
    return [...unlike.slice(0, most), ...rest];
  });
}
