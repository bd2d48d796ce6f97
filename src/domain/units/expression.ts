import { parseArithmetic, type ParsedNode } from './arithmetic-parser';

/**
 * Arithmetic as a small tree of our own: numbers, unit words, + − × ÷ and parentheses. Nothing
 * else can be said in it, so walking it is always quick.
 */
export type Expression =
  | { is: 'number'; value: number }
  | { is: 'unit'; word: string }
  | { is: 'negative'; of: Expression }
  | { is: 'sum' | 'difference' | 'product' | 'quotient'; of: readonly [Expression, Expression] }
  /** A number with its unit beside it: 41.2 cm. */
  | { is: 'measure'; of: readonly [Expression, Expression] };

/** Longest text that is read, and most parts it may have. */
export const mostCharacters = 80;
const mostNodes = 60;

/** Only these characters can belong to arithmetic with units; all else is refused before parsing. */
const readable = /^[\d.+\-*/() a-z]*$/i;

/**
 * mathjs only parses here: its tree is copied node by node into ours, and its evaluation is never
 * called. Answers null for whatever is not plain arithmetic.
 */
export function parseExpression(text: string): Expression | null {
  if (text.length > 3 * mostCharacters || !readable.test(text)) return null;
  let root: ParsedNode;
  try {
    root = parseArithmetic(text);
  } catch {
    return null;
  }
  return copy(root, { nodes: mostNodes });
}

function copy(node: ParsedNode, budget: { nodes: number }): Expression | null {
  budget.nodes -= 1;
  if (budget.nodes < 0) return null;
  if (node.type === 'ParenthesisNode' && node.content) return copy(node.content, budget);
  if (node.type === 'ConstantNode') {
    const { value } = node;
    return typeof value === 'number' && Number.isFinite(value) ? { is: 'number', value } : null;
  }
  if (node.type === 'SymbolNode' && node.name) return { is: 'unit', word: node.name };
  if (node.type !== 'OperatorNode' || !node.args) return null;
  const [a, b] = node.args.map((argument) => copy(argument, budget));
  if (!a) return null;
  if (node.args.length === 1) {
    if (node.op === '-') return { is: 'negative', of: a };
    return node.op === '+' ? a : null;
  }
  if (!b || node.args.length !== 2) return null;
  if (node.op === '*') return { is: node.implicit ? 'measure' : 'product', of: [a, b] };
  if (node.op === '/') return { is: 'quotient', of: [a, b] };
  if (node.op === '+') return { is: 'sum', of: [a, b] };
  return node.op === '-' ? { is: 'difference', of: [a, b] } : null;
}
