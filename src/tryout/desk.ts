/** The page at work: one open workbook, what the toolbar does with it, and what the user is told. */
import { Refusal } from "../core/refusal";
import type { Engine } from "../recalc/engine";
import { ask, notice, sentences } from "./dialogs";
import { newDocument, openDocument, type OpenDocument } from "./document";
import { chooseFile, download, type ChosenFile } from "./files";
import { lossesOf } from "./saving/losses";
import { bytesToSave } from "./saving/save";
import { SAMPLES } from "./samples";

export interface DeskView {
  /** Called when another workbook is on the desk. */
  show(document: OpenDocument): void;
  /** Called when the workbook was changed or saved. */
  title(name: string, changed: boolean): void;
}

export class Desk {
  constructor(
    private readonly engine: Engine,
    private readonly view: DeskView,
    private current: OpenDocument,
  ) {
    this.take(current);
  }

  get document(): OpenDocument {
    return this.current;
  }

  async open(): Promise<void> {
    if (!(await this.mayLeave())) return;
    const file = await chooseFile();
    if (file) this.openFile(file);
  }

  async drop(file: ChosenFile): Promise<void> {
    if (await this.mayLeave()) this.openFile(file);
  }

  async create(): Promise<void> {
    if (await this.mayLeave()) this.take(newDocument(this.engine));
  }

  async sample(id: string): Promise<void> {
    if (!(await this.mayLeave())) return;
    try {
      this.take(await openSample(id, this.engine));
    } catch (reason) {
      notice(sentenceOf(reason), "error");
    }
  }

  async save(): Promise<void> {
    const { current } = this;
    try {
      const saved = await bytesToSave(current, this.engine.functions);
      if (!saved) return;
      download({ name: current.name, bytes: saved.bytes });
      current.journal.saved();
      this.view.title(current.name, false);
      if (saved.remarks.length > 0)
        await ask("Saved, with remarks", [sentences(saved.remarks)], [{ label: "Close", value: undefined, strong: true }]);
      else notice(`${current.name} was saved among your downloads.`);
    } catch (reason) {
      notice(`The workbook could not be saved: ${sentenceOf(reason)}`, "error");
    }
  }

  private openFile({ name, bytes }: ChosenFile): void {
    try {
      const opened = openDocument(name, bytes, this.engine, true);
      this.take(opened);
      const shown = new Set(opened.charts.flatMap(({ parts }) => parts));
      const unseen = lossesOf(opened.package.names.filter((name) => !shown.has(name)));
      if (unseen.length > 0) notice(`Not shown here: ${unseen.join(", ")}. They stay in the file when you save.`);
      if (opened.notes.length > 0) void tellNotes(opened);
    } catch (reason) {
      notice(`${name} could not be opened: ${sentenceOf(reason)}`, "error");
    }
  }

  private take(opened: OpenDocument): void {
    this.current = opened;
    opened.journal.onChange(() => this.view.title(opened.name, opened.journal.changed()));
    this.view.title(opened.name, false);
    this.view.show(opened);
  }

  /** Asks before changes are thrown away. */
  private async mayLeave(): Promise<boolean> {
    if (!this.current.journal.changed()) return true;
    const leave = { label: "Discard the changes", value: true };
    return ask(
      "Changes are not saved",
      [`${this.current.name} was changed and is not saved.`],
      [leave, { label: "Keep working", value: false, strong: true }],
    );
  }
}

export async function openSample(id: string, engine: Engine): Promise<OpenDocument> {
  const sample = SAMPLES.find((candidate) => candidate.id === id);
  if (!sample) throw new Refusal("absent", `There is no sample "${id}"`);
  const answer = await fetch(`samples/${sample.file}`);
  if (!answer.ok) throw new Refusal("absent", `The sample could not be read: samples/${sample.file} answered ${answer.status}`);
  return { ...openDocument(sample.file, new Uint8Array(await answer.arrayBuffer()), engine, false), start: sample.start };
}

function tellNotes(opened: OpenDocument): Promise<void> {
  return ask<void>(
    "Not everything in this file is calculated here",
    [sentences(opened.notes), "It all stays in the file when you save."],
    [{ label: "Continue", value: undefined, strong: true }],
  );
}

/** One sentence for the user, whatever was thrown. */
export function sentenceOf(reason: unknown): string {
  if (reason instanceof Refusal) return reason.message;
  return reason instanceof Error ? reason.message : String(reason);
}
