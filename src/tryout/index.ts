/** The local page: the grid with its workbook, the pane beside it, the toolbar above and the status line below. */
import { registry } from "../functions";
import { handbook } from "../handbook";
import { mountPane } from "../pane";
import { prepareEngine } from "../recalc/engine";
import { library } from "./grid/engine";
import { showAbout } from "./about";
import { buildBar } from "./bar";
import { ChartPanel } from "./charts/panel";
import { Desk, openSample, sentenceOf } from "./desk";
import { ask, notice } from "./dialogs";
import { newDocument, type OpenDocument } from "./document";
import { acceptDrops } from "./files";
import { installChartRanges } from "./grid/chart-ranges";
import { mendFirstKey } from "./grid/first-key";
import { installGate } from "./grid/gate";
import { followNoLinks, silenceKeys, trimMenus } from "./grid/menus";
import { mountGrid, type GridVoice } from "./grid/mount";
import { selectedCell } from "./grid/selection";
import { gridHost } from "./host";
import { byId } from "./page";
import { SAMPLES } from "./samples";
import { showCell } from "./statusline";
import { startTheme } from "./theme";

/** From this width on the pane stands beside the grid; below it is a drawer, closed at first. As in page.css. */
const WIDE = "(min-width: 880px)";

const voice: GridVoice = {
  notify: (text) => notice(text),
  ask(question, confirm, cancel) {
    const choices = [
      { label: "Yes", value: true, strong: true },
      { label: "No", value: false },
    ];
    void ask("Please confirm", [question], choices).then((yes) => (yes ? confirm() : cancel?.()));
  },
};

async function start(): Promise<void> {
  console.debug = () => undefined; // the grid reports every step there
  const theme = startTheme(document.documentElement);
  const engine = prepareEngine(library, registry, handbook);
  installGate(engine);
  installChartRanges();
  trimMenus();
  silenceKeys();
  followNoLinks((sentence) => notice(sentence));
  mendFirstKey();
  const first = await openSample(SAMPLES[0]?.id ?? "", engine).catch((reason) => {
    notice(sentenceOf(reason), "error");
    return newDocument(engine);
  });
  const grid = await mountGrid(byId("sheet"), first.model, theme.current(), voice);
  const host = gridHost(() => desk.document.model, theme);
  const side = sidePane();
  const charts = new ChartPanel(byId("charts"), window.matchMedia(WIDE).matches);
  const refresh = () => {
    charts.follow(desk.document);
    showCell(byId("cell-line"), selectedCell(desk.document.model));
    host.refresh();
  };
  let drawn: OpenDocument | undefined = first;
  const show = (opened: OpenDocument) => {
    opened.model.on("update", opened, () => queueMicrotask(refresh));
    if (opened !== drawn) grid.show(opened.model);
    drawn = opened;
    // Selecting scrolls, and by a wrong measure as long as the grid is not drawn; a workbook is shown from its first cell.
    whenDrawn(opened.model, () => {
      if (opened.start) opened.model.selection.selectCell(opened.start.column, opened.start.row);
      opened.model.dispatch("SET_VIEWPORT_OFFSET", { offsetX: 0, offsetY: 0 });
      refresh();
    });
  };
  const bar = buildBar(byId("actions"), byId("view"), byId("book"), SAMPLES, {
    open: () => void desk.open(),
    save: () => void desk.save(),
    create: () => void desk.create(),
    sample: (id) => void desk.sample(id),
    theme: () => theme.toggle(),
    about: () => void showAbout(),
    side: () => side.toggle(),
  });
  const desk = new Desk(engine, { show, title: (name, changed) => bar.showBook(name, changed) }, first);
  theme.onChange((now) => (grid.setTheme(now), bar.showTheme(now)));
  bar.showTheme(theme.current());
  bar.showSide(side.isOpen());
  mountPane(byId("side"), host);
  acceptDrops(byId("drop-hint"), (file) => void desk.drop(file));
  window.addEventListener("keydown", (event) => saveKey(event, desk), { capture: true });
  window.addEventListener("beforeunload", (event) => {
    if (desk.document.journal.changed()) event.preventDefault();
  });
  document.documentElement.dataset.ready = String(Math.round(performance.now()));
}

/** Does a deed once the grid has measured the model's view, or after two seconds' worth of frames in which it has not. */
function whenDrawn(model: OpenDocument["model"], deed: () => void, frames = 120): void {
  requestAnimationFrame(() => {
    const { width, height } = model.getters.getSheetViewDimension();
    if (frames === 0 || (width > 0 && height > 0)) deed();
    else whenDrawn(model, deed, frames - 1);
  });
}

/** Ctrl+S and Ctrl+O do what a spreadsheet does with them. */
function saveKey(event: KeyboardEvent, desk: Desk): void {
  if (!(event.ctrlKey || event.metaKey) || event.altKey || event.shiftKey) return;
  const deed = { s: () => desk.save(), o: () => desk.open() }[event.key.toLowerCase()];
  if (!deed) return;
  event.preventDefault();
  event.stopImmediatePropagation();
  void deed();
}

function sidePane(): { isOpen(): boolean; toggle(): boolean } {
  const desk = document.querySelector(".desk") as HTMLElement;
  const isOpen = () => !desk.classList.contains("side-closed");
  desk.classList.toggle("side-closed", !window.matchMedia(WIDE).matches);
  return {
    isOpen,
    toggle() {
      desk.classList.toggle("side-closed");
      window.dispatchEvent(new Event("resize")); // the grid measures itself anew
      return isOpen();
    },
  };
}

start().catch((reason: unknown) => {
  notice(`The page could not start: ${sentenceOf(reason)}`, "error");
});
