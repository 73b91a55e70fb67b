/** Files between the page and the computer: chosen, dropped, saved as a download. Nothing is sent anywhere. */

export interface ChosenFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

const ACCEPTED = ".xlsx,.xlsm";
const TYPE = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet";

/** The browser's file dialog; resolves to undefined if it is left without a choice. */
export function chooseFile(): Promise<ChosenFile | undefined> {
  const input = document.createElement("input");
  input.type = "file";
  input.accept = ACCEPTED;
  return new Promise((resolve) => {
    input.addEventListener("change", () => resolve(read(input.files?.[0])));
    input.addEventListener("cancel", () => resolve(undefined));
    input.click();
  });
}

async function read(file: File | undefined): Promise<ChosenFile | undefined> {
  return file && { name: file.name, bytes: new Uint8Array(await file.arrayBuffer()) };
}

export function download({ name, bytes }: ChosenFile): void {
  const address = URL.createObjectURL(new Blob([bytes as BlobPart], { type: TYPE }));
  const link = document.createElement("a");
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 1000);
}

/** Opens a file that is dropped anywhere on the page; shows the hint while one is held over it. */
export function acceptDrops(hint: HTMLElement, open: (file: ChosenFile) => void): void {
  let depth = 0;
  const show = (change: number) => {
    depth = Math.max(0, depth + change);
    hint.hidden = depth === 0;
  };
  const holdsFile = (event: DragEvent) => event.dataTransfer?.types.includes("Files") ?? false;
  window.addEventListener("dragenter", (event) => holdsFile(event) && show(1));
  window.addEventListener("dragleave", (event) => holdsFile(event) && show(-1));
  window.addEventListener("dragover", (event) => holdsFile(event) && event.preventDefault());
  window.addEventListener("drop", (event) => {
    if (!holdsFile(event)) return;
    event.preventDefault();
    show(-depth);
    void read(event.dataTransfer?.files[0]).then((file) => file && open(file));
  });
}
