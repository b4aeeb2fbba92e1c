// The field with the description: line numbers on its left, what is to be said of a line on its right.

export function createEditor(root) {
  const [area, lines, mark, margin, problem] = ["#text", "#lines", "#mark", "#margin", "#problem"].map(
    (name) => root.querySelector(name),
  );
  const narrow = matchMedia("(max-width: 30rem)");
  let remarks = [];

  const lineAt = (offset) => area.value.slice(0, offset).split("\n").length;
  /** Distance of a line from the top of the field, px. */
  const topOf = (line) => {
    const { lineHeight, paddingTop } = getComputedStyle(area);
    return Number.parseFloat(paddingTop) + (line - 1) * Number.parseFloat(lineHeight);
  };

  /** The field is as high as its text, so that it never scrolls away from its line numbers. */
  function grow() {
    const count = area.value.split("\n").length;
    area.rows = Math.max(12, count + 1);
    lines.textContent = Array.from({ length: count }, (_, i) => i + 1).join("\n");
  }

  /** Remarks stand at their lines, each below the one before; where there is no room beside the text, below it. */
  function place() {
    // with remarks the margin has another width, and remarks other heights
    root.classList.toggle("remarked", remarks.length > 0);
    let free = 0;
    for (const { line, element } of remarks) {
      if (narrow.matches) {
        element.style.top = "";
        continue;
      }
      const top = Math.max(free, topOf(line));
      element.style.top = `${top}px`;
      free = top + element.offsetHeight + 6;
    }
    margin.style.minHeight = narrow.matches ? "" : `${free}px`;
  }

  function write(element, { severity, text, line, more }) {
    const go = document.createElement("button");
    go.type = "button";
    go.textContent = `Line ${line}`;
    go.addEventListener("click", () => select(line));
    element.className = severity;
    element.replaceChildren(go, ` ${text}`);
    if (more) {
      const link = Object.assign(document.createElement("a"), { href: more.href, textContent: more.text });
      element.append(" ", link);
    }
  }

  function select(line) {
    const before = area.value
      .split("\n")
      .slice(0, line - 1)
      .join("\n").length;
    const start = before + (line > 1 ? 1 : 0);
    area.focus();
    area.setSelectionRange(start, start + area.value.slice(start).split("\n")[0].length);
  }

  /** Shows remarks, `{ severity, text, line, more }`. The first `problem` is marked and tied to the field. */
  function say(said) {
    const wrong = said.find(({ severity }) => severity === "problem");
    for (const { element } of remarks) if (element !== problem) element.remove();
    remarks = [...said]
      .sort((a, b) => a.line - b.line)
      .map((remark) => {
        const element = remark === wrong ? problem : document.createElement("div");
        write(element, remark);
        if (element !== problem) margin.append(element);
        return { line: remark.line, element };
      });
    problem.hidden = mark.hidden = !wrong;
    if (wrong) mark.style.top = `${topOf(wrong.line)}px`;
    else problem.replaceChildren();
    area.setAttribute("aria-invalid", String(Boolean(wrong)));
    place();
  }

  area.addEventListener("input", grow);
  addEventListener("resize", place);
  grow();
  return {
    lineAt,
    say,
    onInput: (listener) => area.addEventListener("input", listener),
    get text() {
      return area.value;
    },
    set text(text) {
      area.value = text.trimEnd();
      grow();
    },
  };
}
