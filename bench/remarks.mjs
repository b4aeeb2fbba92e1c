// What the numbers mean, for docs/performance.md; to be read again when they change.
export const remarks = ``;
