// What is said of one fault beside its field.

/** The message without what only a reader of the manual needs, and without the other faults, which have remarks of their own. */
export const faultText = ({ message, code, others }) => {
  const more = others.map((other) => `; also: ${other.path}`).join("");
  const end = ` (docs/errors.md#${code})${more}`;
  return message.endsWith(end) ? message.slice(0, -end.length) : message;
};
