// How an export is written by who uses it.
import ts from "typescript";

const LONGEST = 700;

/** The declaration without what is inside; `value` is what the built package exports under the name. */
export function signatureOf({ name, nodes }, value) {
  if (value?.card) return lawSignature(name, value.card);
  const overloads = nodes.filter((node) => !node.body);
  const shown = nodes.length > 1 && overloads.length > 0 ? overloads : nodes;
  return shown.map((node) => declaration(name, node)).join("\n");
}

/** What kind of thing it is, in a word. */
export function kindOf({ nodes: [node] }, value) {
  if (value?.card) return "law";
  if (ts.isInterfaceDeclaration(node) || ts.isTypeAliasDeclaration(node)) return "type";
  if (ts.isClassDeclaration(node)) return "class";
  return typeof value === "function" ? "function" : "constant";
}

function lawSignature(name, { inputs, output }) {
  const port = ([key, { each, optional, default: fallback }]) => {
    const mark = optional || fallback !== undefined ? "?" : "";
    return each ? `${key}: [{ ${Object.entries(each).map(port).join(", ")} }]` : `${key}${mark}`;
  };
  const ports = Object.entries(inputs).map(port).join(", ");
  return `${name}({ ${ports} }) → ${output.unit === "1" ? "a pure number" : output.unit}`;
}

function declaration(name, node) {
  const text = (part) => part.getText();
  const types = node.typeParameters ? `<${node.typeParameters.map(text).join(", ")}>` : "";
  if (ts.isFunctionDeclaration(node)) {
    return `function ${name}${types}(${parametersOf(node)}): ${node.type ? text(node.type) : "void"}`;
  }
  if (ts.isClassDeclaration(node)) return classText(name, node);
  if (!ts.isVariableDeclaration(node)) return text(node).replace(/^export /, "");
  const { type, initializer } = node;
  if (type) return `const ${name}: ${text(type)}`;
  if (ts.isArrowFunction(initializer) && initializer.type) {
    return `function ${name}(${parametersOf(initializer)}): ${text(initializer.type)}`;
  }
  const written = text(initializer).replace(/^\/\* @__PURE__ \*\/ /, "");
  return `const ${name} = ${written.length > LONGEST ? `${written.slice(0, LONGEST).trimEnd()} …` : written}`;
}

/** On one line if they fit. */
function parametersOf({ parameters }) {
  const all = parameters.map((parameter) => parameter.getText());
  const line = all.join(", ");
  return line.length < 90 ? line : `\n  ${all.join(",\n  ")},\n`;
}

function classText(name, node) {
  const heritage = (node.heritageClauses ?? []).map((clause) => ` ${clause.getText()}`).join("");
  const fields = node.members.filter(ts.isPropertyDeclaration).map((member) => {
    const { type, initializer } = member;
    const rest = type ? `: ${type.getText()}` : ` = ${initializer.getText()}`;
    return `  readonly ${member.name.getText()}${rest};`;
  });
  return `class ${name}${heritage} {\n${fields.join("\n")}\n}`;
}
