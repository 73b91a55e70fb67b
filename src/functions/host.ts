/**
 * First module of the add-in entry. The bundle associates every function with its id as it loads; where the host's script is
 * blocked or there is no host at all, the name it calls would be missing and the pane would stay empty. Then this stands in.
 */
interface Associating {
  associate(id: string, implementation: unknown): void;
}

const scope = globalThis as unknown as { CustomFunctions?: Associating };

scope.CustomFunctions ??= { associate: () => undefined };

export {};
