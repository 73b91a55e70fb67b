/** The way out of a form: insert and copy, where the formula would go, and what was done. */
import { copyText } from "./clipboard";
import { element } from "./element";
import { refersTo, type Argument } from "./formula";
import type { Host } from "./host";
import type { Target } from "./target";

export class Outlet {
  readonly buttons: HTMLElement;
  readonly advice = element("p", { class: "still-advice" });
  readonly status = element("p", { class: "still-status", role: "status" });
  private readonly insert = element("button", { type: "submit", class: "still-primary" }, "Insert");
  private readonly copy = element("button", { type: "button" }, "Copy");
  private formula = "";
  private args: readonly Argument[] = [];

  constructor(
    private readonly host: Host,
    private readonly target: Target,
  ) {
    this.buttons = element("div", { class: "still-buttons" }, this.insert, this.copy);
    this.copy.addEventListener("click", () => void this.copyFormula());
    this.insert.hidden = host.kind === "none";
    if (this.insert.hidden) this.copy.className = "still-primary";
    target.onMove(() => this.advise());
  }

  /** The formula of the form as it stands; one that is not ready can be neither inserted nor copied. */
  offer(formula: string, args: readonly Argument[], ready: boolean): void {
    this.formula = formula;
    this.args = args;
    this.insert.disabled = !ready;
    this.copy.disabled = !ready;
    this.advise();
  }

  say(sentence: string): void {
    this.status.textContent = sentence;
  }

  /** Where the formula would go and what speaks against it. */
  private advise(): void {
    const { selection } = this.target;
    this.insert.textContent = selection ? `Insert into ${selection.address}` : "Insert";
    if (this.host.kind === "none") this.advice.textContent = "No workbook here: copy the formula and paste it into a cell.";
    else if (selection && refersTo(this.args, selection.address))
      this.advice.textContent = `The formula would refer to ${selection.address}, the cell it goes into. Select another cell.`;
    else if (selection && selection.formula !== null && selection.formula !== "")
      this.advice.textContent = `${selection.address} is not empty; its content will be replaced.`;
    else this.advice.textContent = "";
  }

  async insertFormula(): Promise<void> {
    const { formula } = this;
    if (this.insert.disabled) return;
    try {
      await this.host.insertFormula(formula);
      this.say(`${formula} inserted${this.target.selection ? ` into ${this.target.selection.address}` : ""}.`);
    } catch (thrown) {
      this.say(thrown instanceof Error ? thrown.message : String(thrown));
    }
  }

  private async copyFormula(): Promise<void> {
    const { formula } = this;
    const copied = await copyText(formula);
    this.say(copied ? `${formula} copied.` : `The browser does not allow copying here; select the formula and copy it by hand: ${formula}`);
  }
}
