import { fail } from "./problem";
import { calledName, mapChildren, type Argument, type Call, type Expression, type Lambda, type Let } from "./tree";

/**
 * LET and applied LAMBDA, by substitution: the engine has neither, and their values do not depend on how often they are computed.
 * A name stands for an expression already substituted in its own scope, so nothing is captured by a later name of the same spelling.
 */
type Bound = { readonly value: Expression } | Closure;

interface Closure {
  readonly lambda: Lambda;
  readonly scope: Scope;
}

type Scope = ReadonlyMap<string, Bound>;

/** Definition of a name that holds a LAMBDA, for calls such as `MYFUNCTION(2)`. */
export type NamedLambda = (name: string) => Expression | undefined;

/** An expression that grows beyond this many nodes is refused: LET within LET can double it with every line. */
const mostNodes = 50000;

/** The same formula without LET and LAMBDA. @throws FormulaProblem if a LAMBDA is not applied at once, or the result grows too large. */
export function substitute(root: Expression, namedLambda: NamedLambda = () => undefined): Expression {
  let nodes = 0;
  let depth = 0;
  const none: Scope = new Map();

  function walk(node: Expression, scope: Scope): Expression {
    if (++nodes > mostNodes) fail("unsupported", `LET or LAMBDA expands to more than ${mostNodes} parts`);
    if (node.type === "ReferenceIdentifier") return nameOrSelf(node, scope);
    if (node.type === "LetExpression") return walk(body(node.body, "LET"), letScope(node, scope));
    if (node.type === "LambdaExpression") return fail("unsupported", "LAMBDA is supported only where it is applied at once");
    const closure = node.type === "CallExpression" ? calleeOf(node, scope) : undefined;
    if (closure) return applied(closure, (node as Call).arguments, scope);
    return mapChildren(node, (child) => walk(child, scope));
  }

  function nameOrSelf(node: Expression & { type: "ReferenceIdentifier" }, scope: Scope): Expression {
    const bound = node.kind === "name" ? scope.get(key(node.value)) : undefined;
    if (!bound) return node;
    if (!("value" in bound)) return fail("unsupported", `${node.value} is a LAMBDA used as a value`);
    nodes += size(bound.value);
    return bound.value;
  }

  function letScope(node: Let, outer: Scope): Scope {
    const scope = new Map(outer);
    for (const { id, init } of node.declarations) scope.set(key(id.name), bind(body(init, "LET"), scope));
    return scope;
  }

  function bind(node: Expression, scope: Scope): Bound {
    return closureOf(node, new Map(scope)) ?? { value: walk(node, scope) };
  }

  /** The LAMBDA that an expression comes to, or undefined if it comes to a value. */
  function closureOf(node: Expression, scope: Scope): Closure | undefined {
    if (node.type === "LambdaExpression") return { lambda: node, scope };
    if (node.type === "ReferenceIdentifier") {
      const bound = scope.get(key(node.value));
      return bound && !("value" in bound) ? bound : undefined;
    }
    if (node.type === "LetExpression") return closureOf(body(node.body, "LET"), letScope(node, scope));
    const callee = node.type === "CallExpression" ? calleeOf(node, scope) : undefined;
    return callee && closureOf(body(callee.lambda.body, "LAMBDA"), argumentScope(callee, (node as Call).arguments, scope));
  }

  function calleeOf(node: Call, scope: Scope): Closure | undefined {
    const name = calledName(node);
    if (name === undefined) return closureOf(node.callee as unknown as Expression, scope);
    const bound = scope.get(key(name));
    if (bound && !("value" in bound)) return bound;
    const named = namedLambda(name);
    return named && closureOf(named, none);
  }

  function applied(closure: Closure, args: readonly Argument[], scope: Scope): Expression {
    if (++depth > 100) fail("unsupported", "A LAMBDA that calls itself is not supported");
    const result = walk(body(closure.lambda.body, "LAMBDA"), argumentScope(closure, args, scope));
    depth--;
    return result;
  }

  function argumentScope(closure: Closure, args: readonly Argument[], scope: Scope): Scope {
    const { params } = closure.lambda;
    if (params.length !== args.length) fail("arguments", `A LAMBDA of ${params.length} parameters got ${args.length} arguments`);
    const inner = new Map(closure.scope);
    params.forEach((param, index) => inner.set(key(param.name), bind(body(args[index]!, "LAMBDA argument"), scope)));
    return inner;
  }

  return walk(root, none);
}

function body(node: Argument, what: string): Expression {
  return node ?? fail("unsupported", `${what} without an expression is not supported`);
}

function key(name: string): string {
  return name.toUpperCase().replace(/^_XLPM\./, "");
}

function size(node: Expression): number {
  let count = 1;
  mapChildren(node, (child) => {
    count += size(child);
    return child;
  });
  return count;
}
