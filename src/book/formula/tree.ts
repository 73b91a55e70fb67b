import type { AstExpression, CallExpression, LambdaExpression, LetExpression } from "@borgar/fx/xlsx";

/**
 * The syntax tree of a formula, as @borgar/fx builds it, with two liberties of our own: an argument left out is null,
 * and the callee of a call may be an expression (an applied LAMBDA). Nodes are never changed once built; a pass builds new ones.
 */
export type Expression = AstExpression;
export type Argument = Expression | null;
export type Call = CallExpression;
export type Let = LetExpression;
export type Lambda = LambdaExpression;

export function literal(value: string | number | boolean): Expression {
  return { type: "Literal", value, raw: String(value) };
}

export function errorLiteral(code: string): Expression {
  return { type: "ErrorLiteral", value: code, raw: code };
}

export function call(name: string, args: readonly Argument[]): Expression {
  return { type: "CallExpression", callee: { type: "Identifier", name }, arguments: [...args] as Expression[] };
}

export function binary(operator: string, left: Expression, right: Expression): Expression {
  return { type: "BinaryExpression", operator, arguments: [left, right] } as Expression;
}

export function unary(operator: string, operand: Expression): Expression {
  return { type: "UnaryExpression", operator, arguments: [operand] } as Expression;
}

export function range(text: string): Expression {
  return { type: "ReferenceIdentifier", value: text, kind: "range" };
}

/** Name of the function called, or undefined where an expression is called. */
export function calledName(node: Call): string | undefined {
  return node.callee.type === "Identifier" ? node.callee.name : undefined;
}

/** The parts of a node that are expressions themselves; arguments left out are passed over. */
export function children(node: Expression): readonly Expression[] {
  switch (node.type) {
    case "UnaryExpression":
    case "BinaryExpression":
      return node.arguments;
    case "CallExpression":
      return present([...(node.callee.type === "Identifier" ? [] : [node.callee as unknown as Expression]), ...node.arguments]);
    case "ArrayExpression":
      return node.elements.flat();
    case "LambdaExpression":
      return present([node.body]);
    case "LetExpression":
      return present([...node.declarations.map((declaration) => declaration.init), node.body]);
    default:
      return [];
  }
}

/** The same node with every direct child replaced by what `change` makes of it. */
export function mapChildren(node: Expression, change: (child: Expression) => Expression): Expression {
  const each = (child: Argument) => (child === null ? null : change(child)) as Expression;
  switch (node.type) {
    case "UnaryExpression":
    case "BinaryExpression":
      return { ...node, type: node.type, arguments: node.arguments.map(each) } as Expression;
    case "CallExpression": {
      const callee =
        node.callee.type === "Identifier" ? node.callee : (each(node.callee as unknown as Expression) as unknown as Call["callee"]);
      return { type: "CallExpression", callee, arguments: node.arguments.map(each) };
    }
    case "ArrayExpression":
      return { type: "ArrayExpression", elements: node.elements.map((row) => row.map(each)) as typeof node.elements };
    case "LambdaExpression":
      return { type: "LambdaExpression", params: node.params, body: each(node.body) };
    case "LetExpression": {
      const declarations = node.declarations.map((declaration) => ({ ...declaration, init: each(declaration.init) }));
      return { type: "LetExpression", declarations, body: each(node.body) };
    }
    default:
      return node;
  }
}

function present(nodes: readonly Argument[]): Expression[] {
  return nodes.filter((node): node is Expression => node !== null && node !== undefined);
}
