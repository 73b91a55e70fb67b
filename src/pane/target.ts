/** The selected cell of the host, followed once for all forms of the pane. */
import type { Host, Selection } from "./host";

export class Target {
  /** The cell that a formula would go to now; null where there is none or the host has not answered yet. */
  selection: Selection | null = null;
  private readonly listeners: (() => void)[] = [];

  constructor(host: Host) {
    host.onSelectionChange((selection) => this.move(selection));
    void host.selection().then((selection) => this.move(selection));
  }

  onMove(listener: () => void): void {
    this.listeners.push(listener);
  }

  private move(selection: Selection | null): void {
    this.selection = selection;
    for (const listener of this.listeners) listener();
  }
}
