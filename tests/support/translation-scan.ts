import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import ts from 'typescript'

/** A use of a text in the source: its namespace and key, `*` standing for what is filled in. */
export interface TextUse {
  readonly file: string
  readonly namespace: string
  readonly key: string
}

const sourceFiles = (folder: string): string[] =>
  readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((name) => /\.tsx?$/.test(name))
    .map((name) => join(folder, name))

/** The texts an expression may be: a literal, a template, either branch of a condition. */
function textsOf(node: ts.Node): string[] {
  if (ts.isStringLiteralLike(node)) return [node.text]
  if (ts.isTemplateExpression(node)) {
    return [node.head.text + node.templateSpans.map((span) => `*${span.literal.text}`).join('')]
  }
  if (ts.isConditionalExpression(node))
    return [...textsOf(node.whenTrue), ...textsOf(node.whenFalse)]
  if (ts.isParenthesizedExpression(node)) return textsOf(node.expression)
  if (ts.isArrayLiteralExpression(node)) return node.elements.flatMap(textsOf)
  return []
}

const isCallOf = (node: ts.Node, name: string): node is ts.CallExpression => {
  if (!ts.isCallExpression(node)) return false
  const { expression } = node
  if (ts.isIdentifier(expression)) return expression.text === name
  return ts.isPropertyAccessExpression(expression) && expression.name.text === name
}

/** The first namespace that `useTranslation` is given below a node, not looking into other functions' uses. */
function namespaceIn(scope: ts.Node): string | undefined {
  let found: string | undefined
  const visit = (node: ts.Node): void => {
    const argument = isCallOf(node, 'useTranslation') ? node.arguments[0] : undefined
    if (argument) found ??= textsOf(argument)[0]
    if (found === undefined) ts.forEachChild(node, visit)
  }
  visit(scope)
  return found
}

function namespaceAt(node: ts.Node): string | undefined {
  for (let scope = node.parent; scope; scope = scope.parent) {
    if (!ts.isFunctionLike(scope) && !ts.isSourceFile(scope)) continue
    const namespace = namespaceIn(scope)
    if (namespace !== undefined) return namespace
  }
  return undefined
}

/** Every `t(...)` and `i18nKey` of a folder whose key is written as a text or a template. */
export function scanTextUses(folder: string): TextUse[] {
  const uses: TextUse[] = []
  for (const file of sourceFiles(folder)) {
    const source = ts.createSourceFile(
      file,
      readFileSync(file, 'utf8'),
      ts.ScriptTarget.Latest,
      true,
      file.endsWith('x') ? ts.ScriptKind.TSX : ts.ScriptKind.TS,
    )
    const note = (node: ts.Node, text: string): void => {
      const [namespace, key] = text.includes(':')
        ? [text.slice(0, text.indexOf(':')), text.slice(text.indexOf(':') + 1)]
        : [namespaceAt(node) ?? '', text]
      uses.push({ file, namespace, key })
    }
    const visit = (node: ts.Node): void => {
      if (isCallOf(node, 't') && node.arguments[0]) {
        for (const text of textsOf(node.arguments[0])) note(node, text)
      }
      if (ts.isJsxAttribute(node) && node.name.getText() === 'i18nKey' && node.initializer) {
        for (const text of textsOf(node.initializer)) note(node, text)
      }
      ts.forEachChild(node, visit)
    }
    visit(source)
  }
  return uses
}
