// npm start: builds where the build is missing or older than the sources, then serves the standalone sheet to this machine only.
import { spawnSync } from "node:child_process";
import { createReadStream, existsSync, readdirSync, statSync } from "node:fs";
import { createServer } from "node:http";
import { dirname, extname, join, normalize, resolve, sep } from "node:path";
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
  "Cache-Control": "no-cache",
};

/** The file that a request asks for, or undefined where it leaves the folder or there is none. */
function fileOf(folder, url) {
  let path;
  try {
    path = decodeURIComponent(new URL(url, "http://localhost").pathname);
  } catch {
    return undefined;
  }
  if (path.includes("\0")) return undefined;
  const file = normalize(join(folder, path === "/" ? "sheet.html" : path));
  if (!file.startsWith(resolve(folder) + sep)) return undefined;
  return existsSync(file) && statSync(file).isFile() ? file : undefined;
}

function handle(folder, request, response) {
  if (request.method !== "GET" && request.method !== "HEAD") {
    response.writeHead(405, { ...headers, Allow: "GET, HEAD" }).end();
    return;
  }
  const file = fileOf(folder, request.url ?? "/");
  if (file === undefined) {
    response.writeHead(404, { ...headers, "Content-Type": "text/plain; charset=utf-8" }).end("There is no such page here.\n");
    return;
  }
  response.writeHead(200, {
    ...headers,
    "Content-Type": types[extname(file)] ?? "application/octet-stream",
    "Content-Length": statSync(file).size,
  });
  if (request.method === "HEAD") response.end();
  else createReadStream(file).pipe(response);
}

/** Serves a folder on the loopback address, on the first free port from the one asked for. */
export async function serve({ port = firstPort, folder = join(root, "dist") } = {}) {
  for (let tried = port; tried < port + portsTried; tried++) {
    const server = createServer((request, response) => handle(folder, request, response));
    const free = await new Promise((done) => {
      server.once("error", () => done(false));
      server.listen(tried, "127.0.0.1", () => done(true));
    });
    if (free) return { port: tried, close: () => new Promise((done) => server.close(done)) };
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
  }
  const { port } = await serve();
  console.log(`Filmbook: http://localhost:${port}/sheet.html   (Ctrl+C ends it)`);
}
