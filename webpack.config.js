import { resolve } from "node:path";
import CopyPlugin from "copy-webpack-plugin";
import HtmlPlugin from "html-webpack-plugin";
import CssPlugin from "mini-css-extract-plugin";
import { MetadataPlugin } from "./src/hosts/build/metadata-plugin.js";

const root = import.meta.dirname ?? resolve(".");
const at = (...parts) => resolve(root, ...parts);
const office = at("node_modules/@microsoft/office-js/dist");

const typescript = { test: /\.ts$/, loader: "ts-loader", options: { transpileOnly: true, compilerOptions: { noEmit: false } } };
const shared = {
  output: { path: at("dist"), hashFunction: "xxhash64" },
  // Sources import each other by the names that the modules will have.
  resolve: { extensions: [".ts", ".js"], extensionAlias: { ".js": [".ts", ".js"] } },
  performance: { hints: false },
  stats: "errors-warnings",
  devtool: false,
};

/** The functions alone: loads in a bare realm, exports under one name, associates itself. */
const functions = {
  ...shared,
  name: "functions",
  target: "es2020",
  entry: { functions: at("src/hosts/excel/functions.ts") },
  module: { rules: [typescript] },
  output: {
    ...shared.output,
    chunkFormat: "array-push",
    chunkLoading: false,
    wasmLoading: false,
    globalObject: "globalThis",
    library: { name: "FilmbookFunctions", type: "var", export: "platformFunctions" },
  },
  plugins: [new MetadataPlugin({ source: at("src/cells/functions.ts"), bundle: "functions.js", library: "FilmbookFunctions" })],
};

/** What runs of office.js, already minified: nothing else of it is served. */
const officeFiles = [
  "office.js",
  "o15apptofilemappingtable.js",
  "excel-*.js",
  "custom-functions-runtime.js",
  // Words in the host's language: where they are missing, a failed request stands before the English ones.
  "*-*/office_strings.js",
  "ariatelemetry/*.js",
  "telemetry/*.js",
];

/** The two pages: the task pane for Excel and the standalone sheet. */
const pages = {
  ...shared,
  name: "pages",
  target: ["web", "es2020"],
  entry: { taskpane: at("src/hosts/excel/taskpane.ts"), sheet: at("src/hosts/sheet/sheet.ts") },
  // The embedded spreadsheet comes minified: doing it again takes minutes and gains little over a loopback.
  optimization: { minimize: false },
  module: { rules: [typescript, { test: /\.css$/, use: [CssPlugin.loader, "css-loader"] }] },
  output: { ...shared.output, filename: "[name].js", chunkFilename: "[name].js", assetModuleFilename: "assets/[name][ext]" },
  plugins: [
    new CssPlugin({ filename: "[name].css", chunkFilename: "[name].css", ignoreOrder: true }),
    new HtmlPlugin({
      filename: "taskpane.html",
      template: at("src/hosts/excel/taskpane.html"),
      chunks: ["taskpane"],
      scriptLoading: "defer",
    }),
    new HtmlPlugin({ filename: "sheet.html", template: at("src/hosts/sheet/sheet.html"), chunks: ["sheet"], scriptLoading: "defer" }),
    new CopyPlugin({
      patterns: [
        ...officeFiles.map((from) => ({
          from,
          context: office,
          to: "office",
          noErrorOnMissing: true,
          globOptions: { ignore: ["**/*.debug.js"] },
          info: { minimized: true },
        })),
        { from: at("manifest.xml"), to: "manifest.xml" },
        { from: "*.png", context: at("src/hosts/excel/icons"), to: "icons" },
      ],
    }),
  ],
  devServer: {
    server: "https",
    host: "localhost",
    port: 3000,
    static: { directory: at("dist") },
    hot: false,
    liveReload: false,
    client: false,
    headers: { "Access-Control-Allow-Origin": "*" },
  },
};

export default [functions, pages];
