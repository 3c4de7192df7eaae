import type { Content, WireMessage } from "./wire.js";

/** A rendering of a value in one or more formats, by mime type. */
export interface MimeBundle {
  readonly [mime: string]: unknown;
}

/** What a cell put out, as a notebook of format 4 stores it. */
export type CellOutput =
  | { output_type: "stream"; name: "stdout" | "stderr"; text: string }
  | { output_type: "display_data"; data: MimeBundle; metadata: Content }
  | {
      output_type: "execute_result";
      data: MimeBundle;
      metadata: Content;
      execution_count: number | null;
    }
  | { output_type: "error"; ename: string; evalue: string; traceback: string[] };

type Shown = Extract<CellOutput, { data: MimeBundle }>;

/** The places that a display id stands for, over all cells of one kernel. */
export type Displays = Map<string, Shown[]>;

/** Gathers the outputs of one cell from the messages that its kernel publishes. */
export class CellOutputs {
  readonly list: CellOutput[] = [];
  private clearsAtNext = false;
  constructor(private readonly displays: Displays) {}

  take({ header, content }: WireMessage): void {
    switch (header.msg_type) {
      case "stream":
        this.stream(content["name"] === "stderr" ? "stderr" : "stdout", textOf(content, "text"));
        break;
      case "display_data":
        this.show({ output_type: "display_data", ...shownIn(content) }, idIn(content));
        break;
      case "execute_result": {
        const count = content["execution_count"];
        const execution_count = typeof count === "number" ? count : null;
        this.show(
          { output_type: "execute_result", ...shownIn(content), execution_count },
          idIn(content),
        );
        break;
      }
      case "update_display_data":
        for (const shown of this.displays.get(idIn(content) ?? "") ?? [])
          Object.assign(shown, shownIn(content));
        break;
      case "error":
        this.push({ output_type: "error", ...errorIn(content) });
        break;
      case "clear_output":
        if (content["wait"] === true) this.clearsAtNext = true;
        else this.list.length = 0;
    }
  }

  private push(output: CellOutput): void {
    if (this.clearsAtNext) this.list.length = 0;
    this.clearsAtNext = false;
    this.list.push(output);
  }
  private stream(name: "stdout" | "stderr", text: string): void {
    const last = this.list.at(-1);
    if (!this.clearsAtNext && last?.output_type === "stream" && last.name === name)
      last.text += text;
    else this.push({ output_type: "stream", name, text });
  }
  private show(shown: Shown, id: string | null): void {
    this.push(shown);
    if (id !== null) this.displays.set(id, [...(this.displays.get(id) ?? []), shown]);
  }
}

/** The error that an `error` message or a failed reply tells. */
export const errorIn = (
  content: Content,
): { ename: string; evalue: string; traceback: string[] } => ({
  ename: textOf(content, "ename") || "Error",
  evalue: textOf(content, "evalue"),
  traceback: Array.isArray(content["traceback"]) ? content["traceback"].map(String) : [],
});

const shownIn = (content: Content): { data: MimeBundle; metadata: Content } => ({
  data: objectOf(content["data"]),
  metadata: objectOf(content["metadata"]),
});

function idIn(content: Content): string | null {
  const id = objectOf(content["transient"])["display_id"];
  return typeof id === "string" ? id : null;
}

function textOf(content: Content, field: string): string {
  const x = content[field];
  return typeof x === "string" ? x : "";
}

const objectOf = (x: unknown): Content =>
  typeof x === "object" && x !== null ? (x as Content) : {};
