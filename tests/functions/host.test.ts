/** The stand-in for the host's name: there when the host's script is not, and out of the way when it is. */
const scope = globalThis as { CustomFunctions?: { associate(id: string, implementation: unknown): void } };

afterEach(() => {
  delete scope.CustomFunctions;
});

const load = () => jest.isolateModules(() => void jest.requireActual("../../src/functions/host"));

test("without a host the lines that associate functions run into nothing", () => {
  load();
  expect(() => scope.CustomFunctions?.associate("CV.AT", () => [[1]])).not.toThrow();
  expect(scope.CustomFunctions).toBeDefined();
});

test("the host's own stays", () => {
  const associated: string[] = [];
  const own = { associate: (id: string) => void associated.push(id) };
  scope.CustomFunctions = own;
  load();
  scope.CustomFunctions.associate("CV.AT", undefined);
  expect([scope.CustomFunctions === own, associated]).toEqual([true, ["CV.AT"]]);
});
