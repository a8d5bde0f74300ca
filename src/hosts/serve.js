// npm start: builds where the build is missing or older than the sources, then serves the standalone sheet to this machine only.
import { spawnSync } from "node:child_process";
import { createReadStream, existsSync, readdirSync, readFileSync, statSync, utimesSync } from "node:fs";
import { createServer } from "node:http";
import { dirname, extname, join, normalize, resolve, sep } from "node:path";
import { pipeline } from "node:stream";
import { fileURLToPath } from "node:url";

const root = resolve(dirname(fileURLToPath(import.meta.url)), "../..");
const firstPort = 4173;
const portsTried = 50;

const types = {
  ".html": "text/html; charset=utf-8",
  ".js": "text/javascript; charset=utf-8",
  ".json": "application/json; charset=utf-8",
  ".css": "text/css; charset=utf-8",
  ".xml": "application/xml; charset=utf-8",
  ".svg": "image/svg+xml",
  ".png": "image/png",
  ".woff2": "font/woff2",
  ".woff": "font/woff",
  ".ttf": "font/ttf",
};

const headers = {
  "X-Content-Type-Options": "nosniff",
  "Referrer-Policy": "no-referrer",
  "Cross-Origin-Opener-Policy": "same-origin",
  "Cross-Origin-Resource-Policy": "same-origin",
  "Cache-Control": "no-cache",
};

/** For a page that declares no policy of its own: nothing may load. */
const noPolicy = "default-src 'none'; base-uri 'none'; form-action 'none'";

/** The policy that a page declares in its head, so that the header and the page cannot disagree. */
function policyOf(file) {
  const declared = /<meta\s+http-equiv="Content-Security-Policy"\s+content="([^"]+)"/i.exec(readFileSync(file, "utf8"));
  return declared?.[1] ?? noPolicy;
}

/** The decoded path of a request, or undefined where it cannot be read. */
function pathOf(url) {
  try {
    const path = decodeURIComponent(new URL(url, "http://localhost").pathname);
    return path.includes("\0") ? undefined : path;
  } catch {
    return undefined;
  }
}

/** The file that a path leads to, or undefined where it leaves the folder or there is none. */
function fileOf(folder, path) {
  const file = normalize(join(folder, path));
  if (!file.startsWith(resolve(folder) + sep)) return undefined;
  return existsSync(file) && statSync(file).isFile() ? file : undefined;
}

function handle(folder, request, response) {
  if (request.method !== "GET" && request.method !== "HEAD") {
    response.writeHead(405, { ...headers, Allow: "GET, HEAD" }).end();
    return;
  }
  const path = pathOf(request.url ?? "/");
  if (path === "/") {
    response.writeHead(302, { ...headers, Location: "/sheet.html" }).end();
    return;
  }
  const file = path === undefined ? undefined : fileOf(folder, path);
  if (file === undefined) {
    response.writeHead(404, { ...headers, "Content-Type": "text/plain; charset=utf-8" }).end("There is no such page here.\n");
    return;
  }
  const kind = extname(file);
  response.writeHead(200, {
    ...headers,
    ...(kind === ".html" ? { "Content-Security-Policy": policyOf(file) } : {}),
    "Content-Type": types[kind] ?? "application/octet-stream",
    "Content-Length": statSync(file).size,
  });
  if (request.method === "HEAD") response.end();
  // A rebuild may take the file away while it is read: that ends one answer, not the server.
  else pipeline(createReadStream(file), response, () => undefined);
}

/** Listens on one port of the loopback address; false where another program has it. */
function listen(server, port) {
  return new Promise((done, failed) => {
    server.once("error", (fault) => (fault.code === "EADDRINUSE" ? done(false) : failed(fault)));
    server.listen(port, "127.0.0.1", () => done(true));
  });
}

function close(server) {
  return new Promise((done) => {
    server.close(done);
    server.closeAllConnections();
  });
}

/** Serves a folder on the loopback address, on the first free port from the one asked for. */
export async function serve({ port = firstPort, folder = join(root, "dist") } = {}) {
  for (let tried = port; tried < port + portsTried; tried++) {
    const server = createServer((request, response) => handle(folder, request, response));
    if (await listen(server, tried)) return { port: tried, close: () => close(server) };
  }
  throw new Error(`no free port from ${port} to ${port + portsTried - 1}`);
}

function newest(path) {
  const stat = statSync(path);
  if (!stat.isDirectory()) return stat.mtimeMs;
  return Math.max(0, ...readdirSync(path).map((name) => newest(join(path, name))));
}

/** Is the build missing, or older than anything it is made from? */
export function isStale() {
  const built = join(root, "dist/sheet.html");
  if (!existsSync(built)) return true;
  const made = statSync(built).mtimeMs;
  return ["src", "webpack.config.js", "manifest.xml", "package-lock.json"].some((name) => newest(join(root, name)) > made);
}

if (process.argv[1] !== undefined && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  if (isStale()) {
    console.log("Building (about a minute) …");
    const { status } = spawnSync(process.execPath, [join(root, "src/hosts/build/build.js")], { stdio: "inherit" });
    if (status !== 0) process.exit(status ?? 1);
    // The bundler leaves a file alone that comes out as it was: without a new date the next start would build again.
    const now = new Date();
    utimesSync(join(root, "dist/sheet.html"), now, now);
  }
  const { port } = await serve();
  console.log(`Filmbook: http://localhost:${port}/sheet.html   (Ctrl+C ends it)`);
}
