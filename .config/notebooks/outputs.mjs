// The outputs of a notebook without what differs from run to run: execution counts, metadata, how texts are cut into lines.

const joined = (text) => (Array.isArray(text) ? text.join("") : text);

function plain(output) {
  if (output.output_type === "stream") return { stream: output.name, text: joined(output.text) };
  if (output.output_type === "error") return { error: `${output.ename}: ${output.evalue}` };
  const forms = Object.entries(output.data).sort(([a], [b]) => (a < b ? -1 : 1));
  return Object.fromEntries(forms.map(([type, data]) => [type, joined(data)]));
}

/** The code cells of a notebook: their code, and their outputs by MIME type. */
export const codeCells = (notebook) =>
  notebook.cells
    .filter((cell) => cell.cell_type === "code")
    .map(({ id, source, outputs }) => ({ id, code: joined(source), outputs: outputs.map(plain) }));

/** What is new or different in the outputs of `found`, in lines; none where all is as in `stored`. */
export function outputDifferences(stored, found) {
  const [old, fresh] = [codeCells(stored), codeCells(found)];
  return fresh.flatMap(({ id, outputs }, i) => {
    const before = old[i]?.outputs ?? [];
    const errors = outputs.flatMap(({ error }) => (error ? [`${id} ends with ${error}`] : []));
    if (errors.length > 0) return errors;
    if (before.length !== outputs.length)
      return [`${id} has ${outputs.length} outputs, stored are ${before.length}`];
    return outputs.flatMap((output, j) => {
      const types = [...new Set([...Object.keys(before[j]), ...Object.keys(output)])];
      return types.flatMap((type) => {
        const [was, is] = [before[j][type], output[type]].map(textOf);
        return was === is ? [] : [`${id}, ${type}: ${aroundDifference(was, is)}`];
      });
    });
  });
}

const textOf = (data) => (typeof data === "string" ? data : (JSON.stringify(data) ?? "nothing"));

function aroundDifference(was, is) {
  let at = 0;
  while (at < was.length && was[at] === is[at]) at++;
  const part = (text) => JSON.stringify(text.slice(Math.max(0, at - 20), at + 40));
  return `stored ${part(was)}, now ${part(is)}`;
}

/** The notebook with the outputs of a run, numbered from 1, in the form that is kept. */
export function withOutputs(stored, found) {
  let count = 0;
  const fresh = new Map(found.cells.map((cell) => [cell.id, cell.outputs]));
  const cells = stored.cells.map((cell) => {
    if (cell.cell_type !== "code") return cell;
    count++;
    const outputs = fresh.get(cell.id).map((output) => kept(output, count));
    return { ...cell, execution_count: count, outputs };
  });
  return { ...stored, cells };
}

function kept(output, count) {
  if (output.output_type === "stream") return output;
  const data = Object.fromEntries(Object.entries(plain(output)).map(([type, form]) => [type, inLines(form)]));
  const counted = output.output_type === "execute_result" ? { execution_count: count } : {};
  return { data, ...counted, metadata: {}, output_type: output.output_type };
}

/** Texts are stored as lists of lines, so that a difference is a difference of lines. */
const inLines = (form) => (typeof form === "string" ? form.split(/(?<=\n)/) : form);
