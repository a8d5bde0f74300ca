// A page that is left must not write into the one that follows it, however late what it had under way comes back.
import { expect, test } from "vitest";
import type { SheetHost } from "../../src/pane/host.js";
import { textIn } from "../../src/pane/node.js";
import type { Child } from "../../src/pane/node.js";
import type { Frame } from "../../src/pane/page.js";
import { thisCellPage } from "../../src/pane/this-cell/page.js";
import { MemoryHost } from "./memory-host.js";

test("This cell: nothing is shown after the end, though the host answers late and goes on telling", async () => {
  const memory = new MemoryHost({ Plant: { A1: 1 } });
  let release: () => void = () => undefined;
  const gate = new Promise<void>((open) => {
    release = open;
  });
  const listeners: (() => void)[] = [];
  const host: SheetHost = Object.assign(Object.create(memory) as MemoryHost, {
    selection: async () => {
      await gate;
      return memory.selection();
    },
    // A host that forgets to stop telling.
    onValuesChanged: (listener: () => void) => {
      listeners.push(listener);
      return () => undefined;
    },
  });
  const shown: string[] = [];
  const content = { addEventListener: () => undefined, querySelector: () => null } as unknown as HTMLElement;
  const frame: Frame = {
    host,
    content,
    show: (children: readonly Child[]) => shown.push(children.map(textIn).join(" ")),
    open: () => undefined,
    has: () => false,
    say: () => undefined,
  };
  const end = thisCellPage.begin(frame, {});
  const before = shown.length;
  end();
  release();
  for (const listener of listeners) listener();
  await new Promise((resume) => setTimeout(resume, 250));
  expect(shown.length).toBe(before);
});
