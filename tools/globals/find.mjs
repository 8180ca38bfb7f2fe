import ts from 'typescript';
import { adapters, banned, entries, globalObjects } from './banned.mjs';

/** @typedef {{ file: string, line: number, name: string, text: string }} Found */

/** @param {ts.BindingName} name @returns {string[]} */
const boundNames = (name) =>
  ts.isIdentifier(name)
    ? [name.text]
    : name.elements.flatMap((element) => (ts.isBindingElement(element) ? boundNames(element.name) : []));

/** The names that a scope declares itself. @param {ts.Node} scope @returns {string[]} */
function declaredIn(scope) {
  /** @type {string[]} */
  const names = [];
  if (ts.isFunctionLike(scope)) names.push(...scope.parameters.flatMap(({ name }) => boundNames(name)));
  if (ts.isCatchClause(scope) && scope.variableDeclaration)
    names.push(...boundNames(scope.variableDeclaration.name));
  const list =
    ts.isForStatement(scope) || ts.isForOfStatement(scope) || ts.isForInStatement(scope)
      ? scope.initializer
      : undefined;
  if (list && ts.isVariableDeclarationList(list))
    names.push(...list.declarations.flatMap(({ name }) => boundNames(name)));
  if (ts.isBlock(scope) || ts.isSourceFile(scope) || ts.isModuleBlock(scope)) {
    for (const statement of scope.statements) {
      if (ts.isVariableStatement(statement)) {
        // `const { now } = Date` declares `now`, and is a use of `Date` all the same.
        names.push(...statement.declarationList.declarations.flatMap(({ name }) => boundNames(name)));
      } else if (
        (ts.isFunctionDeclaration(statement) || ts.isClassDeclaration(statement)) &&
        statement.name
      ) {
        names.push(statement.name.text);
      } else if (ts.isImportDeclaration(statement)) {
        const clause = statement.importClause;
        if (clause?.name) names.push(clause.name.text);
        const bindings = clause?.namedBindings;
        if (bindings && ts.isNamespaceImport(bindings)) names.push(bindings.name.text);
        if (bindings && ts.isNamedImports(bindings))
          names.push(...bindings.elements.map(({ name }) => name.text));
      }
    }
  }
  return names;
}

/** @param {ts.Identifier} node */
function isShadowed(node) {
  for (let scope = /** @type {ts.Node} */ (node.parent); scope; scope = scope.parent) {
    if (declaredIn(scope).includes(node.text)) return true;
  }
  return false;
}

/** Whether an identifier stands for a value: not a member's name, a key, a declaration or a type. @param {ts.Identifier} node */
function isValue(node) {
  const { parent } = node;
  if (ts.isPropertyAccessExpression(parent)) return parent.expression === node;
  if (ts.isPropertyAssignment(parent) || ts.isEnumMember(parent)) return parent.initializer === node;
  if (ts.isShorthandPropertyAssignment(parent)) return true;
  if (ts.isBindingElement(parent) || ts.isVariableDeclaration(parent) || ts.isParameter(parent)) {
    return parent.initializer === node;
  }
  if (ts.isJsxAttribute(parent) || ts.isQualifiedName(parent) || ts.isTypeNode(parent)) return false;
  if (ts.isImportSpecifier(parent) || ts.isExportSpecifier(parent) || ts.isLabeledStatement(parent))
    return false;
  return !('name' in parent && parent.name === node);
}

/**
 * What a use of a global is called in the list of the banned, or undefined when it is harmless.
 * `whole` is the expression that stands for the global: `Date`, or `globalThis.Date`.
 *
 * @param {ts.Expression} whole @param {string} name
 */
function usedAs(whole, name) {
  const { parent } = whole;
  if (banned.some((one) => one.name === name)) return name;
  const members = banned.filter((one) => one.name.startsWith(`${name}.`)).map((one) => one.name);
  if (name === 'Date') {
    if (ts.isNewExpression(parent) && parent.expression === whole) {
      return parent.arguments?.length ? undefined : 'Date()';
    }
    if (ts.isCallExpression(parent) && parent.expression === whole) return 'Date()';
    if (ts.isBinaryExpression(parent) && parent.operatorToken.kind === ts.SyntaxKind.InstanceOfKeyword)
      return undefined;
  } else if (members.length === 0) return undefined;
  if (ts.isPropertyAccessExpression(parent) && parent.expression === whole) {
    const member = `${name}.${parent.name.text}`;
    return members.includes(member) ? member : undefined;
  }
  if (ts.isTypeOfExpression(parent)) return undefined;
  // Handed on whole (`const m = Math`, `{ now } = Date`, `Math['random']`): whoever gets it can do anything.
  return members[0];
}

/**
 * The banned globals that a source text uses.
 *
 * @param {string} file its path from the project's root, with forward slashes
 * @param {string} text
 * @returns {Found[]}
 */
export function findBannedGlobals(file, text) {
  if (adapters.some((folder) => file.startsWith(folder))) return [];
  const allowed = entries.find((entry) => entry.file.test(file))?.names ?? [];
  const kind = file.endsWith('x') ? ts.ScriptKind.TSX : ts.ScriptKind.TS;
  const source = ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true, kind);
  /** @type {Found[]} */
  const found = [];

  /** @param {ts.Identifier} node */
  const look = (node) => {
    if (!isValue(node) || isShadowed(node)) return;
    /** @type {ts.Expression} */
    let whole = node;
    let name = node.text;
    while (globalObjects.includes(name)) {
      const { parent } = whole;
      if (ts.isPropertyAccessExpression(parent) && parent.expression === whole) name = parent.name.text;
      else if (ts.isElementAccessExpression(parent) && ts.isStringLiteral(parent.argumentExpression)) {
        name = parent.argumentExpression.text;
      } else return;
      whole = parent;
    }
    const use = usedAs(whole, name);
    const rule = banned.find((one) => one.name === use);
    if (!rule || allowed.includes(rule.name)) return;
    const line = source.getLineAndCharacterOfPosition(node.getStart(source)).line + 1;
    found.push({
      file,
      line,
      name: rule.name,
      text: `${file}:${line}: no ${rule.name} here: ${rule.instead}`,
    });
  };

  /** @param {ts.Node} node */
  const walk = (node) => {
    if (ts.isTypeNode(node)) return;
    if (ts.isIdentifier(node)) look(node);
    ts.forEachChild(node, walk);
  };
  walk(source);
  return found;
}
