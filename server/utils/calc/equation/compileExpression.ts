import { create, parseDependencies, type MathNode } from 'mathjs/number'
import { CalcInputError } from '../calcInputError'

/** A parsed expression: what it needs, and its value for given numbers. */
export interface CompiledExpression {
  /** Names of variables and constants it reads, in order of appearance. */
  symbols: readonly string[]
  /** Its value. @param scope every symbol by name. */
  valueOf: (scope: Record<string, number>) => number
  /** The expression as it is read aloud, with names: `70 × M^0.75`. */
  written: string
  /** The expression with the values written in. @param write how a number is written. */
  filledIn: (scope: Record<string, number>, write: (value: number) => string) => string
}

const { parse } = create({ parseDependencies: parseDependencies! })
const FUNCTIONS: Record<string, (value: number) => number> = { exp: Math.exp, log10: Math.log10, sqrt: Math.sqrt }
const OPERATORS = new Set(['+', '-', '*', '/', '^'])
// Parsing takes longer than a whole plan; the records of an edition never change.
const compiled = new Map<string, CompiledExpression>()

/**
 * Parses an expression of the reference data, with a closed set of operations: + - * / ^, unary minus, parentheses,
 * exp, log10 and sqrt. The same parse gives the value and the working.
 *
 * @param expression  for example `70 * M ^ 0.75`.
 * @returns the compiled expression; the same object for the same text.
 * @throws CalcInputError `equation.expression` when it does not parse or holds anything outside the closed set.
 * @source house rule (expressions are data; nothing in them may run code)
 * @example compileExpression('70 * M ^ 0.75').valueOf({ M: 1 }) // 70
 */
export function compileExpression(expression: string): CompiledExpression {
  const known = compiled.get(expression)
  if (known) return known
  let node: MathNode
  try {
    node = parse(expression)
  }
  catch (error) {
    throw new CalcInputError('equation.expression', `The expression "${expression}" cannot be read: ${error instanceof Error ? error.message : 'it does not parse'}.`)
  }
  const symbols: string[] = []
  const valueOf = closureOf(node, symbols, expression)
  const made: CompiledExpression = {
    symbols: Object.freeze([...new Set(symbols)]),
    valueOf,
    written: fill(node, name => name),
    filledIn: (scope, write) => fill(node, name => write(scope[name]!)),
  }
  compiled.set(expression, made)
  return made
}

/** Plain closures instead of mathjs' own evaluation: typed numbers only, nothing else can be reached, and far faster. */
function closureOf(node: MathNode, symbols: string[], expression: string): (scope: Record<string, number>) => number {
  const refuse = (what: string): never => {
    throw new CalcInputError('equation.expression', `The expression "${expression}" holds ${what}, which is not allowed.`)
  }
  const walk = (one: MathNode): (scope: Record<string, number>) => number => {
    if (isKind(one, 'ParenthesisNode')) return walk(one.content)
    if (isKind(one, 'ConstantNode')) {
      const value = Number(one.value)
      return typeof one.value === 'number' && Number.isFinite(value) ? () => value : refuse('a constant that is no number')
    }
    if (isKind(one, 'SymbolNode')) {
      const { name } = one
      symbols.push(name)
      return scope => scope[name]!
    }
    if (isKind(one, 'FunctionNode')) {
      const run = FUNCTIONS[one.fn.name] ?? refuse(`the function ${one.fn.name}`)
      if (one.args.length !== 1) return refuse(`${one.fn.name} with ${one.args.length} values`)
      const inner = walk(one.args[0]!)
      return scope => run(inner(scope))
    }
    if (isKind(one, 'OperatorNode')) {
      // "2 M" reads like a product to some and like a slip to others; the sign has to be written.
      if (one.implicit) return refuse('a product without its sign')
      const [left, right] = one.args.map(walk)
      if (one.args.length === 1 && one.op === '-') return scope => -left!(scope)
      if (one.args.length !== 2 || !OPERATORS.has(one.op)) return refuse(`the operator ${one.op}`)
      switch (one.op) {
        case '+': return scope => left!(scope) + right!(scope)
        case '-': return scope => left!(scope) - right!(scope)
        case '*': return scope => left!(scope) * right!(scope)
        case '/': return scope => left!(scope) / right!(scope)
        default: return scope => left!(scope) ** right!(scope)
      }
    }
    return refuse(`a ${one.type}`)
  }
  return walk(node)
}

/** Numbers of the expression itself stay as published; names are written by `writeName`. */
function fill(node: MathNode, writeName: (name: string) => string): string {
  if (isKind(node, 'ParenthesisNode')) return `(${fill(node.content, writeName)})`
  if (isKind(node, 'ConstantNode')) return String(node.value)
  if (isKind(node, 'SymbolNode')) return writeName(node.name)
  if (isKind(node, 'FunctionNode')) return `${node.fn.name}(${fill(node.args[0]!, writeName)})`
  if (isKind(node, 'OperatorNode')) {
    const parts = node.args.map(one => fill(one, writeName))
    if (parts.length === 1) return `−${parts[0]}`
    const sign = { '*': '×', '/': '÷', '-': '−' }[node.op] ?? node.op
    return node.op === '^' ? `${parts[0]}^${parts[1]}` : `${parts[0]} ${sign} ${parts[1]}`
  }
  return ''
}

interface Kinds {
  ParenthesisNode: { content: MathNode }
  ConstantNode: { value: unknown }
  SymbolNode: { name: string }
  FunctionNode: { fn: { name: string }, args: MathNode[] }
  OperatorNode: { op: string, args: MathNode[], implicit: boolean }
}

function isKind<Kind extends keyof Kinds>(node: MathNode, kind: Kind): node is MathNode & Kinds[Kind] {
  return node.type === kind
}
