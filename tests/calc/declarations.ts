import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import ts from 'typescript'

export interface Declaration {
  readonly file: string
  /** The text between the stars of its docstring, one line each; empty without one. */
  readonly doc: readonly string[]
  readonly parameters: readonly { readonly name: string, readonly members: readonly string[] }[]
}

const root = path.join(import.meta.dirname, '../../lib/calc')

const sourceFiles = readdirSync(root, { recursive: true, encoding: 'utf8' })
  .filter((name) => name.endsWith('.ts'))
  .map((name) => ({ name, file: ts.createSourceFile(name, readFileSync(path.join(root, name), 'utf8'), ts.ScriptTarget.ES2022, true) }))

const membersByInterface = new Map<string, string[]>()
for (const { file } of sourceFiles) {
  for (const statement of file.statements) {
    if (ts.isInterfaceDeclaration(statement)) membersByInterface.set(statement.name.text, statement.members.map((member) => member.name?.getText() ?? ''))
  }
}

const docOf = (node: ts.Node): string[] => {
  const ranges = ts.getLeadingCommentRanges(node.getSourceFile().text, node.pos) ?? []
  const last = ranges.at(-1)
  const text = last ? node.getSourceFile().text.slice(last.pos, last.end) : ''
  if (!text.startsWith('/**')) return []
  return text.slice(3, -2).split('\n').map((line) => line.replace(/^\s*\* ?/, '').trimEnd()).filter((line, i) => i > 0 || line !== '')
}

const parametersOf = (parameters: readonly ts.ParameterDeclaration[]) => parameters.map((parameter) => {
  const type = parameter.type?.getText() ?? ''
  return { name: parameter.name.getText(), members: membersByInterface.get(/(\w+)(\[\])?$/.exec(type)?.[1] ?? '') ?? [] }
})

/** Every exported function of the library by name, whatever file it stands in. */
export const declarations = new Map<string, Declaration>()
for (const { name, file } of sourceFiles) {
  for (const statement of file.statements) {
    const isExported = ts.canHaveModifiers(statement) && ts.getModifiers(statement)?.some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword)
    if (!isExported) continue
    // Of overloads the first carries the docstring.
    if (ts.isFunctionDeclaration(statement) && statement.name && !declarations.has(statement.name.text)) {
      declarations.set(statement.name.text, { file: name, doc: docOf(statement), parameters: parametersOf(statement.parameters) })
    }
    if (ts.isVariableStatement(statement)) {
      for (const { name: variable, initializer } of statement.declarationList.declarations) {
        if (initializer && ts.isArrowFunction(initializer)) declarations.set(variable.getText(), { file: name, doc: docOf(statement), parameters: parametersOf(initializer.parameters) })
      }
    }
  }
}
