import { join, sep } from "node:path";
import { licenceOf, packageFolder } from "../../src/build/licences.mjs";
import { folderWith } from "./folders";

const path = (text: string) => text.replaceAll("/", sep);

test.each([
  ["/a/src/core/refusal.ts", undefined],
  ["/a/node_modules/plain/lib/x.js", "/a/node_modules/plain"],
  ["/a/node_modules/@scope/name/x.js", "/a/node_modules/@scope/name"],
  ["/a/node_modules/outer/node_modules/inner/x.js", "/a/node_modules/outer/node_modules/inner"],
])("%s belongs to %s", (file, folder) => {
  expect(packageFolder(path(file))).toBe(folder && path(folder));
});

test("a package tells its licence by name, by text, or by both", () => {
  const packages = folderWith({
    "both/package.json": '{"name":"both","version":"1.0.0","license":"MIT"}',
    "both/LICENSE.md": "the text\n",
    "both/NOTICE": "the notice",
    "older/package.json": '{"name":"older","version":"1.0.0","licenses":[{"type":"BSD"},{"type":"MIT"}]}',
    "silent/package.json": '{"name":"silent","version":"1.0.0"}',
    "silent/LICENCE": "the text",
  });
  expect(licenceOf(join(packages, "both"))).toBe("both 1.0.0 (MIT)\n\nthe text\n\nthe notice");
  expect(licenceOf(join(packages, "older"))).toBe("older 1.0.0 (BSD or MIT)");
  expect(licenceOf(join(packages, "silent"))).toBe("silent 1.0.0 (licence below)\n\nthe text");
});

test("a package without any is refused", () => {
  const folder = folderWith({ "package.json": '{"name":"bare","version":"1.0.0"}' });
  expect(() => licenceOf(folder)).toThrow("the package bare tells its licence nowhere");
});
