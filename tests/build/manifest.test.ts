import { addinId, baseAddress, DEFAULT_BASE, manifestVersion } from "../../src/build/manifest.mjs";
import { below, child, parseXml } from "../../src/build/xml.mjs";
import { filledManifest } from "./filled-manifest";

test("the base address comes from one variable and ends without a slash", () => {
  expect(baseAddress(undefined)).toBe(DEFAULT_BASE);
  expect(baseAddress("  ")).toBe(DEFAULT_BASE);
  expect(baseAddress("https://tools.example/stillwall/")).toBe("https://tools.example/stillwall");
});

test.each(["http://tools.example", "tools.example", "ftp://x"])("%s is refused as an address", (text) => {
  expect(() => baseAddress(text)).toThrow(`STILLWALL_BASE_URL is "${text}", must be an https address`);
});

test("the version has four numbers and begins with 1", () => {
  expect(manifestVersion("0.1.0")).toBe("1.0.1.0");
  expect(manifestVersion("2.13.4-beta.1")).toBe("1.2.13.4");
  expect(() => manifestVersion("next")).toThrow(/must begin with three numbers/);
});

// RFC 9562, version 5: checked once against Python's uuid.uuid5(NAMESPACE_URL, "https://localhost:3000/manifest.xml").
test("an address keeps its id, and another address has another", () => {
  expect(addinId(DEFAULT_BASE)).toBe("2d1a46d4-bafc-5e9d-b2f5-9c734a672701");
  expect(addinId("https://tools.example")).not.toBe(addinId(DEFAULT_BASE));
});

test("the manifest is filled in for an address, and nothing of the template is left", () => {
  const base = "https://tools.example/stillwall";
  const text = filledManifest(base);
  expect(text).not.toMatch(/__[A-Z]+__|localhost/);
  const root = parseXml(text);
  expect(child(root, "Id")?.text).toBe(addinId(base));
  expect(child(root, "Version")?.text).toBe("1.0.1.0");
  expect(child(root, "DisplayName")?.attributes.DefaultValue).toBe("Stillwall");
  expect(below(root, "bt:Url").every(({ attributes }) => attributes.DefaultValue?.startsWith(`${base}/`))).toBe(true);
});

test("on the own machine the add-in says so in its name", () => {
  const root = parseXml(filledManifest(DEFAULT_BASE));
  expect(child(root, "DisplayName")?.attributes.DefaultValue).toBe("Stillwall (this machine)");
});
