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
  return new Substitution(namedLambda).walk(root, new Map());
}

class Substitution {
  private nodes = 0;
  private depth = 0;

  constructor(private readonly namedLambda: NamedLambda) {}

  walk(node: Expression, scope: Scope): Expression {
    if (++this.nodes > mostNodes) fail("unsupported", `LET or LAMBDA expands to more than ${mostNodes} parts`);
    if (node.type === "ReferenceIdentifier") return this.nameOrSelf(node, scope);
    if (node.type === "LetExpression") return this.walk(body(node.body, "LET"), this.letScope(node, scope));
    if (node.type === "LambdaExpression") return fail("unsupported", "LAMBDA is supported only where it is applied at once");
    const closure = node.type === "CallExpression" ? this.calleeOf(node, scope) : undefined;
    if (closure) return this.applied(closure, (node as Call).arguments, scope);
    return mapChildren(node, (child) => this.walk(child, scope));
  }

  private nameOrSelf(node: Expression & { type: "ReferenceIdentifier" }, scope: Scope): Expression {
    const bound = node.kind === "name" ? scope.get(key(node.value)) : undefined;
    if (!bound) return node;
    if (!("value" in bound)) return fail("unsupported", `${node.value} is a LAMBDA used as a value`);
    this.nodes += size(bound.value);
    return bound.value;
  }

  private letScope(node: Let, outer: Scope): Scope {
    const scope = new Map(outer);
    for (const { id, init } of node.declarations) scope.set(key(id.name), this.bind(body(init, "LET"), scope));
    return scope;
  }

  private bind(node: Expression, scope: Scope): Bound {
    return this.closureOf(node, new Map(scope)) ?? { value: this.walk(node, scope) };
  }

  /** The LAMBDA that an expression comes to, or undefined if it comes to a value. */
  private closureOf(node: Expression, scope: Scope): Closure | undefined {
    if (node.type === "LambdaExpression") return { lambda: node, scope };
    if (node.type === "ReferenceIdentifier") {
      const bound = scope.get(key(node.value));
      return bound && !("value" in bound) ? bound : undefined;
    }
    if (node.type === "LetExpression") return this.closureOf(body(node.body, "LET"), this.letScope(node, scope));
    const callee = node.type === "CallExpression" ? this.calleeOf(node, scope) : undefined;
    return (
      callee &&
      this.nested(() => this.closureOf(body(callee.lambda.body, "LAMBDA"), this.argumentScope(callee, (node as Call).arguments, scope)))
    );
  }

  private calleeOf(node: Call, scope: Scope): Closure | undefined {
    const name = calledName(node);
    if (name === undefined) return this.closureOf(node.callee as unknown as Expression, scope);
    const bound = scope.get(key(name));
    if (bound && !("value" in bound)) return bound;
    const named = this.namedLambda(name);
    return named && this.closureOf(named, new Map());
  }

  private applied(closure: Closure, args: readonly Argument[], scope: Scope): Expression {
    return this.nested(() => this.walk(body(closure.lambda.body, "LAMBDA"), this.argumentScope(closure, args, scope)));
  }

  private nested<T>(apply: () => T): T {
    if (++this.depth > 100) fail("unsupported", "A LAMBDA that calls itself is not supported");
    const result = apply();
    this.depth--;
    return result;
  }

  private argumentScope(closure: Closure, args: readonly Argument[], scope: Scope): Scope {
    const { params } = closure.lambda;
    if (params.length !== args.length) fail("arguments", `A LAMBDA of ${params.length} parameters got ${args.length} arguments`);
    const inner = new Map(closure.scope);
    params.forEach((param, index) => inner.set(key(param.name), this.bind(body(args[index]!, "LAMBDA argument"), scope)));
    return inner;
  }
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
