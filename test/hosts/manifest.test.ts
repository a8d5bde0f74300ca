// The manifest against the published rules that a store or a host would hold it to (the schemas OfficeAppManifestV1_1,
// TaskPaneAppVersionOverridesV1_0 and OfficeAppBasicTypes), offline. The schemas do not notice a dangling resource id,
// an icon that is not there, or a version that says something else: this does.
import { readFileSync } from "node:fs";
import { join, resolve } from "node:path";
import { DOMParser, type Document, type Element, onWarningStopParsing } from "@xmldom/xmldom";
import { describe, expect, test } from "vitest";
import { version } from "../../src/version.js";

const root = resolve(import.meta.dirname, "../..");
const text = readFileSync(join(root, "manifest.xml"), "utf8");
const base = "https://localhost:3000/";
const instance = "http://www.w3.org/2001/XMLSchema-instance";
const manifest = parsed(text);
const elements = below(manifest.documentElement as Element);

function parsed(xml: string): Document {
  return new DOMParser({ onError: onWarningStopParsing }).parseFromString(xml, "text/xml");
}

function childrenOf(element: Element): readonly Element[] {
  return Array.from(element.childNodes).filter((one): one is Element => one.nodeType === 1);
}

function below(element: Element): readonly Element[] {
  return [element, ...childrenOf(element).flatMap(below)];
}

function named(name: string): readonly Element[] {
  return elements.filter((one) => one.localName === name);
}

function only(name: string, among: readonly Element[] = elements): Element {
  const found = among.filter((one) => one.localName === name);
  expect(found, name).toHaveLength(1);
  return found[0] as Element;
}

function namesOf(children: readonly Element[]): readonly (string | null)[] {
  return children.map((one) => one.localName);
}

/** Kind of an element of several kinds, such as an extension point. */
function kindOf(element: Element): string | null {
  return element.getAttributeNS(instance, "type");
}

function extensionPoint(kind: string): Element {
  const found = named("ExtensionPoint").filter((one) => kindOf(one) === kind);
  expect(found, kind).toHaveLength(1);
  return found[0] as Element;
}

const overrides = only("VersionOverrides");
const resources = new Map(
  below(only("Resources"))
    .filter((one) => one.hasAttribute("id"))
    .map((one) => [one.getAttribute("id") as string, one]),
);
const addressOrText = (id: string): string => resources.get(id)?.getAttribute("DefaultValue") ?? "";

describe("form", () => {
  test("is well formed, and a parser that would pass anything would be noticed", () => {
    expect(manifest.documentElement?.localName).toBe("OfficeApp");
    expect(kindOf(manifest.documentElement as Element)).toBe("TaskPaneApp");
    expect(() => parsed(text.replace("</Hosts>", ""))).toThrow();
    expect(() => parsed(text.replace('lifetime="long"', "lifetime=long"))).toThrow();
  });

  test("the id is a GUID, and no GUID of nothing", () => {
    const id = only("Id").textContent ?? "";
    expect(id).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-[1-5][0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/i);
  });

  test("elements stand in the order that the schema asks for", () => {
    expect(namesOf(childrenOf(manifest.documentElement as Element))).toEqual([
      "Id",
      "Version",
      "ProviderName",
      "DefaultLocale",
      "DisplayName",
      "Description",
      "IconUrl",
      "HighResolutionIconUrl",
      "SupportUrl",
      "AppDomains",
      "Hosts",
      "Requirements",
      "DefaultSettings",
      "Permissions",
      "VersionOverrides",
    ]);
    expect(namesOf(childrenOf(overrides))).toEqual(["Hosts", "Resources"]);
    expect(namesOf(childrenOf(only("Host", below(overrides))))).toEqual(["Runtimes", "AllFormFactors", "DesktopFormFactor"]);
    expect(namesOf(childrenOf(only("DesktopFormFactor")))).toEqual(["GetStarted", "FunctionFile", "ExtensionPoint"]);
    expect(namesOf(childrenOf(extensionPoint("CustomFunctions")))).toEqual(["Script", "Page", "Metadata", "Namespace"]);
    expect(namesOf(childrenOf(only("Control")))).toEqual(["Label", "Supertip", "Icon", "Action"]);
    expect(namesOf(childrenOf(only("Resources")))).toEqual(["Images", "Urls", "ShortStrings", "LongStrings"]);
  });

  test("the workbook is its one host, in both places", () => {
    const hosts = named("Host");
    expect(hosts).toHaveLength(2);
    expect(hosts[0]?.getAttribute("Name")).toBe("Workbook");
    expect(kindOf(hosts[1] as Element)).toBe("Workbook");
  });

  test("asks for the shared runtime alone, so that no older host is shut out by the rest", () => {
    const sets = named("Set");
    expect(sets.map((one) => [one.getAttribute("Name"), one.getAttribute("MinVersion")])).toEqual([["SharedRuntime", "1.1"]]);
    expect(named("Method")).toHaveLength(0);
  });
});

describe("words", () => {
  test("every version says the same", () => {
    const stated = JSON.parse(readFileSync(join(root, "package.json"), "utf8")) as { version: string };
    expect(only("Version").textContent).toBe(`${version}.0`);
    expect(stated.version).toBe(version);
    expect(version).toMatch(/^\d{1,5}\.\d{1,5}\.\d{1,5}$/);
  });

  test("provider, name and description", () => {
    expect(only("ProviderName").textContent).toBe("Filmbook");
    expect(only("DisplayName").getAttribute("DefaultValue")).toBe("Filmbook");
    const description = childrenOf(manifest.documentElement as Element).find((one) => one.localName === "Description");
    const words = description?.getAttribute("DefaultValue") ?? "";
    expect(words.length).toBeGreaterThan(20);
    expect(words.length).toBeLessThanOrEqual(250);
  });

  test("strings keep to their lengths: short 125, long 250, ids 32", () => {
    for (const id of resources.keys()) expect(id, id).toMatch(/^[A-Za-z][\w.]{0,31}$/);
    const strings = named("String");
    expect(strings.length).toBeGreaterThanOrEqual(5);
    for (const one of strings) {
      const most = (one.parentNode as Element).localName === "ShortStrings" ? 125 : 250;
      const words = one.getAttribute("DefaultValue") ?? "";
      expect(words.length, one.getAttribute("id") ?? "").toBeGreaterThan(0);
      expect(words.length, one.getAttribute("id") ?? "").toBeLessThanOrEqual(most);
    }
  });
});

describe("resources", () => {
  test("no id stands twice, none dangles, none lies unused", () => {
    const ids = below(only("Resources"))
      .filter((one) => one.hasAttribute("id"))
      .map((one) => one.getAttribute("id") as string);
    expect(new Set(ids).size).toBe(ids.length);
    const used = new Set(elements.filter((one) => one.hasAttribute("resid")).map((one) => one.getAttribute("resid") as string));
    expect([...used].sort()).toEqual([...ids].sort());
  });

  test("each kind of resource stands where that kind is read", () => {
    const groups: Readonly<Record<string, string>> = {
      Image: "Images",
      Title: "ShortStrings",
      Label: "ShortStrings",
      Namespace: "ShortStrings",
      Description: "LongStrings",
      SourceLocation: "Urls",
      FunctionFile: "Urls",
      LearnMoreUrl: "Urls",
      Runtime: "Urls",
    };
    for (const one of elements.filter((each) => each.hasAttribute("resid"))) {
      const resource = resources.get(one.getAttribute("resid") as string) as Element;
      expect((resource.parentNode as Element).localName, one.localName ?? "").toBe(groups[one.localName as string]);
    }
  });

  test("every address is https", () => {
    const addresses = elements
      .map((one) => one.getAttribute("DefaultValue") ?? (one.localName === "AppDomain" ? one.textContent : null))
      .filter((one): one is string => one?.includes("://") ?? false);
    expect(addresses.length).toBeGreaterThan(8);
    for (const one of addresses) expect(one).toMatch(/^https:\/\//);
  });

  test("the namespace is FILM, a short string", () => {
    expect(addressOrText(only("Namespace").getAttribute("resid") as string)).toBe("FILM");
  });

  test("one long-lived runtime serves functions, commands and pane, under one id", () => {
    const runtime = only("Runtime");
    expect(runtime.getAttribute("lifetime")).toBe("long");
    const resid = runtime.getAttribute("resid");
    const within = (element: Element, name: string): string | null => only(name, below(element)).getAttribute("resid");
    expect(within(only("Page"), "SourceLocation")).toBe(resid);
    expect(only("FunctionFile").getAttribute("resid")).toBe(resid);
    expect(kindOf(only("Action"))).toBe("ShowTaskpane");
    expect(within(only("Action"), "SourceLocation")).toBe(resid);
    expect(named("TaskpaneId")).toHaveLength(0);
    expect(addressOrText(resid as string)).toBe(`${base}taskpane.html`);
    expect(only("SourceLocation", below(only("DefaultSettings"))).getAttribute("DefaultValue")).toBe(`${base}taskpane.html`);
  });

  test("script and metadata are the two files of the functions bundle", () => {
    const addressIn = (name: string): string => addressOrText(only("SourceLocation", below(only(name))).getAttribute("resid") as string);
    expect(addressIn("Script")).toBe(`${base}functions.js`);
    expect(addressIn("Metadata")).toBe(`${base}functions.json`);
  });
});

/** Width and height as the head of a PNG file states them (PNG specification, IHDR), after its signature. */
function dimensionsOf(address: string): readonly [number, number] {
  const file = readFileSync(join(root, "src/hosts/excel/icons", address.slice(`${base}icons/`.length)));
  expect([...file.subarray(0, 8)]).toEqual([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  return [file.readUInt32BE(16), file.readUInt32BE(20)];
}

describe("icons", () => {
  test("each place has 16, 32 and 80", () => {
    const places = named("Icon");
    expect(places).toHaveLength(2);
    for (const place of places) expect(childrenOf(place).map((one) => one.getAttribute("size"))).toEqual(["16", "32", "80"]);
  });

  test("each file has the size that its place states", () => {
    for (const image of named("Image").filter((one) => one.hasAttribute("size"))) {
      const size = Number(image.getAttribute("size"));
      expect(dimensionsOf(addressOrText(image.getAttribute("resid") as string))).toEqual([size, size]);
    }
    expect(dimensionsOf(only("IconUrl").getAttribute("DefaultValue") as string)).toEqual([32, 32]);
    expect(dimensionsOf(only("HighResolutionIconUrl").getAttribute("DefaultValue") as string)).toEqual([64, 64]);
  });
});
