// The loopback server over a folder of its own making: fails where a path leads out of the folder, another method than
// reading is answered, the policy of a page is not the one that it declares, or a taken port stops the start.
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { request } from "node:http";
import { createServer, type Server } from "node:net";
import { networkInterfaces, tmpdir } from "node:os";
import { join, resolve } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { serve } from "../../src/hosts/serve.js";

interface Answer {
  readonly status: number;
  readonly headers: Readonly<Record<string, string | string[] | undefined>>;
  readonly body: string;
}

const root = resolve(import.meta.dirname, "../..");
const policy = "default-src 'none'; script-src 'self'; style-src 'self'";
const page = `<!doctype html><meta\n  http-equiv="Content-Security-Policy"\n  content="${policy}"\n/><title>page</title>`;
let above: string;
let served: Awaited<ReturnType<typeof serve>>;

beforeAll(async () => {
  above = mkdtempSync(join(tmpdir(), "filmbook-served-"));
  const folder = join(above, "dist");
  mkdirSync(join(folder, "icons"), { recursive: true });
  mkdirSync(join(above, "dist-of-another"));
  writeFileSync(join(folder, "sheet.html"), page);
  writeFileSync(join(folder, "bare.html"), "<!doctype html><title>no policy of its own</title>");
  writeFileSync(join(folder, "sheet.js"), "export const µ = 1;");
  writeFileSync(join(folder, "pane.css"), "a{}");
  writeFileSync(join(folder, "functions.json"), "{}");
  writeFileSync(join(folder, "manifest.xml"), "<a/>");
  writeFileSync(join(folder, "icons/icon.png"), "not really");
  writeFileSync(join(folder, "a name.js"), "1");
  writeFileSync(join(above, "secret.txt"), "secret");
  writeFileSync(join(above, "dist-of-another/secret.txt"), "secret");
  served = await serve({ port: 4520, folder });
});

afterAll(async () => {
  await served.close();
  rmSync(above, { recursive: true });
});

/** The path goes out as it stands: a browser or fetch would tidy its dots first. */
function ask(path: string, method = "GET", host = "127.0.0.1"): Promise<Answer> {
  return new Promise((done, failed) => {
    const asked = request({ host, port: served.port, path, method }, (response) => {
      let body = "";
      response.setEncoding("utf8");
      response.on("data", (part: string) => {
        body += part;
      });
      response.on("end", () => done({ status: response.statusCode ?? 0, headers: response.headers, body }));
    });
    asked.on("error", failed);
    asked.end();
  });
}

describe("what is served", () => {
  test.each([
    ["/sheet.html", "text/html; charset=utf-8"],
    ["/sheet.js", "text/javascript; charset=utf-8"],
    ["/sheet.js?version=1", "text/javascript; charset=utf-8"],
    ["/pane.css", "text/css; charset=utf-8"],
    ["/functions.json", "application/json; charset=utf-8"],
    ["/manifest.xml", "application/xml; charset=utf-8"],
    ["/icons/icon.png", "image/png"],
    ["/a%20name.js", "text/javascript; charset=utf-8"],
  ])("%s as %s", async (path, type) => {
    const { status, headers, body } = await ask(path);
    expect(status).toBe(200);
    expect(headers["content-type"]).toBe(type);
    expect(headers["x-content-type-options"]).toBe("nosniff");
    expect(Number(headers["content-length"])).toBe(Buffer.byteLength(body));
  });

  test("the root leads to the sheet", async () => {
    const { status, headers } = await ask("/");
    expect(status).toBe(302);
    expect(headers.location).toBe("/sheet.html");
  });
});

describe("policy", () => {
  test("a page's header says what the page says", async () => {
    expect((await ask("/sheet.html")).headers["content-security-policy"]).toBe(policy);
  });

  test("a page without a policy may load nothing", async () => {
    expect((await ask("/bare.html")).headers["content-security-policy"]).toMatch(/^default-src 'none'/);
  });

  test.each(["src/hosts/sheet/sheet.html", "src/hosts/excel/taskpane.html"])("%s declares a strict one", (name) => {
    const declared = /http-equiv="Content-Security-Policy"\s+content="([^"]+)"/.exec(readFileSync(join(root, name), "utf8"))?.[1] ?? "";
    const directives = new Map(declared.split(";").map((one) => [one.trim().split(" ")[0], one.trim().split(" ").slice(1)]));
    expect(directives.get("default-src")).toEqual(["'none'"]);
    expect(directives.get("script-src")).toEqual(["'self'"]);
    expect(directives.get("connect-src")).toEqual(["'self'"]);
    expect(declared).not.toMatch(/unsafe-eval|https?:|\*/);
  });
});

describe("what is refused", () => {
  test.each([
    "/../secret.txt",
    "/../../../../../../etc/hostname",
    "/%2e%2e/secret.txt",
    "/..%2fsecret.txt",
    "/%2e%2e%2fsecret.txt",
    "/icons/../../secret.txt",
    "/..%2fdist-of-another%2fsecret.txt",
    "/..%5csecret.txt",
    "//../secret.txt",
    "/sheet.html%00.js",
    "/%",
    "/icons",
    "/icons/",
    "/none.html",
  ])("%s is not found", async (path) => {
    const { status, body } = await ask(path);
    expect(status).toBe(404);
    expect(body).not.toContain("secret");
  });

  test.each(["POST", "PUT", "DELETE", "OPTIONS", "PATCH"])("%s is not allowed", async (method) => {
    const { status, headers, body } = await ask("/sheet.html", method);
    expect(status).toBe(405);
    expect(headers.allow).toBe("GET, HEAD");
    expect(body).toBe("");
  });

  test("HEAD has the headers and no body", async () => {
    const { status, headers, body } = await ask("/sheet.html", "HEAD");
    expect(status).toBe(200);
    expect(Number(headers["content-length"])).toBe(Buffer.byteLength(page));
    expect(body).toBe("");
  });

  test("the other addresses of the machine do not answer", async () => {
    const others = Object.values(networkInterfaces()).flatMap((one) =>
      (one ?? []).filter((each) => !each.internal && each.family === "IPv4"),
    );
    for (const { address } of others) await expect(ask("/sheet.html", "GET", address)).rejects.toThrow();
    await expect(ask("/sheet.html", "GET", "127.0.0.2")).rejects.toThrow();
  });
});

describe("ports", () => {
  test("a second start takes the next free port", async () => {
    const second = await serve({ port: served.port, folder: join(above, "dist") });
    expect(second.port).toBeGreaterThan(served.port);
    expect(second.port).toBeLessThan(served.port + 50);
    await second.close();
  });

  test("a port that another program holds is passed over, and is free again after close", async () => {
    const taken: Server = createServer();
    await new Promise<void>((done) => taken.listen(0, "127.0.0.1", done));
    const { port } = taken.address() as { port: number };
    const next = await serve({ port, folder: join(above, "dist") });
    expect(next.port).toBeGreaterThan(port);
    await new Promise((done) => taken.close(done));
    const again = await serve({ port, folder: join(above, "dist") });
    expect(again.port).toBe(port);
    await again.close();
    await next.close();
  });
});
