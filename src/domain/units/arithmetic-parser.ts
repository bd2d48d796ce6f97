import {
  ConstantNodeDependencies,
  OperatorNodeDependencies,
  ParenthesisNodeDependencies,
  SymbolNodeDependencies,
  create,
  // @ts-expect-error the package's types leave this factory out
  createParse,
  factory,
  typedDependencies,
} from 'mathjs/number';

/** The few fields of a parsed node that are read. */
export interface ParsedNode {
  type: string;
  value?: unknown;
  name?: string;
  op?: string;
  implicit?: boolean;
  args?: ParsedNode[];
  content?: ParsedNode;
}

/** Kinds of node that arithmetic has no use for: building one throws, so no such tree exists. */
const refusedNodes = [
  'AccessorNode',
  'ArrayNode',
  'AssignmentNode',
  'BlockNode',
  'ConditionalNode',
  'FunctionAssignmentNode',
  'FunctionNode',
  'IndexNode',
  'ObjectNode',
  'RangeNode',
  'RelationalNode',
].map((name) => factory(name, [], () => refused));

class refused {
  constructor() {
    throw new SyntaxError('only numbers, units, + − × ÷ and parentheses are read');
  }
}

const parser = create({
  typedDependencies,
  ConstantNodeDependencies,
  OperatorNodeDependencies,
  ParenthesisNodeDependencies,
  SymbolNodeDependencies,
  createNumeric: factory('numeric', [], () => (text: string) => Number(text)),
  createParse,
  ...Object.fromEntries(refusedNodes.map((node, index) => [`refused${index}`, node])),
} as never) as unknown as { parse(text: string): ParsedNode };

/**
 * mathjs's parser with only the nodes of arithmetic in it: small in a browser bundle, and unable to
 * build anything else. It parses; nothing is evaluated. Throws SyntaxError.
 */
export function parseArithmetic(text: string): ParsedNode {
  return parser.parse(text);
}
