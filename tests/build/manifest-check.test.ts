/** The offline check finds each kind of fault: every case breaks one thing in a folder that is good otherwise. */
import { readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { icon, ICON_SIZES } from "../../src/build/icons.mjs";
import { checkAddin } from "../../src/build/manifest-check.mjs";
import { filledManifest } from "./filled-manifest";
import { folderWith } from "./folders";

const metadata = {
  allowErrorForDataTypeAny: true,
  functions: [
    {
      id: "TWICE.OF",
      name: "TWICE.OF",
      description: "Twice a number.",
      helpUrl: "https://localhost:3000/help.html#TWICE.OF",
      parameters: [
        { name: "value", description: "A number" },
        { name: "unit", description: "Unit of the result", optional: true },
      ],
    },
  ],
};

const icons = Object.fromEntries(ICON_SIZES.map((size) => [`assets/icon-${size}.png`, icon(size)]));

let manifest = "";
beforeAll(() => {
  manifest = filledManifest("https://localhost:3000");
});

function goodFolder(): string {
  return folderWith({
    "manifest.xml": manifest,
    "functions.json": JSON.stringify(metadata),
    "functions.js": 'CustomFunctions.associate("TWICE.OF",a);',
    "taskpane.html": "<!doctype html>",
    "help.html": '<section id="TWICE.OF">',
    ...icons,
  });
}

function faultsAfter(file: string, from: string | RegExp, to: string): string[] {
  const folder = goodFolder();
  const before = readFileSync(join(folder, file), "utf8");
  const after = before.replace(from, to);
  expect(after).not.toBe(before);
  writeFileSync(join(folder, file), after);
  return checkAddin(folder);
}

test("a good folder has no fault", () => {
  expect(checkAddin(goodFolder())).toEqual([]);
});

test.each<[string, string | RegExp, string, RegExp]>([
  ["order", /( {2}<Version>.*\n)( {2}<ProviderName>.*\n)/, "$2$1", /in OfficeApp the element Version stands too late/],
  ["an unknown element", "<Hosts>", "<Colour/><Hosts>", /unknown element Colour/],
  ["no description", /<Description DefaultValue.*\n/, "", /Description is missing/],
  ["a long description", "Worksheet functions", "Worksheet functions ".repeat(20), /Description has \d+ characters, must have 1 to 250/],
  ["no GUID", /<Id>.*<\/Id>/, "<Id>stillwall</Id>", /"stillwall" is not a GUID/],
  ["a version below 1", "<Version>1.", "<Version>0.", /"0.0.1.0" is not one to four numbers/],
  ["a permission", "ReadWriteDocument", "ReadDocument", /must be ReadWriteDocument/],
  ["a runtime of its own", '<Runtime resid="Pane.Url"', '<Runtime resid="Help.Url"', /uses Pane.Url, the Runtime uses Help.Url/],
  ["a short runtime", 'lifetime="long"', 'lifetime="short"', /lifetime="long"/],
  ["no metadata", /<Metadata>[^]*<\/Metadata>/, "", /has no Metadata/],
  ["an icon size", '<bt:Image size="80" resid="Icon.80"/>', "", /no image of 80 px/],
  ["a resource that is missing", '<bt:Url id="Help.Url"', '<bt:Url id="Other.Url"', /refers to Help.Url, which Resources does not hold/],
  ["a resource not used", '<bt:Url id="Help.Url"', '<bt:Url id="Other.Url"', /the resource Other.Url is not used/],
  ["a resource of another kind", 'size="16" resid="Icon.16"', 'size="16" resid="Pane.Url"', /Pane.Url, which is one of bt:Urls/],
  ["a long resource id", /Icon\.16/g, "Icon.16".repeat(6), /must have 1 to 32 characters/],
  ["a resource twice", '<bt:Image id="Icon.20"', '<bt:Image id="Icon.16"', /"Icon.16" stands twice/],
  ["a long text", "Search species", "Search species ".repeat(20), /Button.Tip has \d+ characters, must have 1 to 250/],
  ["a namespace with a space", 'DefaultValue="STILL"', 'DefaultValue="STILL WALL"', /the namespace "STILL WALL"/],
  ["plain http", "https://localhost:3000/functions.js", "http://localhost:3000/functions.js", /is not https/],
  ["another server", "https://localhost:3000/functions.js", "https://elsewhere.example/functions.js", /does not begin with/],
  ["a file that is not there", "functions.json", "functions.abc.json", /names a file that is not there/],
  ["a picture of another size", "assets/icon-40.png", "assets/icon-48.png", /has 48 x 48 pixels, must have 40 x 40/],
])("manifest: %s", (_, from, to, fault) => {
  expect(faultsAfter("manifest.xml", from, to).join("\n")).toMatch(fault);
});

test.each<[string, string, string | RegExp, string, RegExp]>([
  ["not associated", "functions.js", "TWICE.OF", "TWICE.TO", /TWICE.OF is in functions.json and not associated/],
  ["associated only", "functions.js", "TWICE.OF", "TWICE.TO", /TWICE.TO is associated in functions.js and not in functions.json/],
  ["error cells", "functions.json", "true", "false", /does not let error cells through/],
  ["no description", "functions.json", "A number", "", /TWICE.OF, value: the description has 0 characters/],
  ["a long one", "functions.json", "A number", "A number ".repeat(40), /TWICE.OF, value: the description has \d+ characters/],
  ["two lines", "functions.json", "A number", "A number\\nor two", /has more than one line/],
  ["a name", "functions.json", /TWICE.OF/g, "ABC12", /the name ABC12 reads as a cell address/],
  ["no help", "help.html", "TWICE.OF", "OTHER", /the help page does not hold it/],
  [
    "order of arguments",
    "functions.json",
    /(\{"name":"value"[^}]*\}),(\{"name":"unit"[^}]*\})/,
    "$2,$1",
    /a required argument stands after/,
  ],
])("functions: %s", (_, file, from, to, fault) => {
  expect(faultsAfter(file, from, to).join("\n")).toMatch(fault);
});

test.each(["manifest.xml", "functions.json", "functions.js", "help.html", "taskpane.html", "assets/icon-64.png"])("%s missing", (file) => {
  const folder = goodFolder();
  rmSync(join(folder, file));
  expect(checkAddin(folder)).not.toEqual([]);
});
