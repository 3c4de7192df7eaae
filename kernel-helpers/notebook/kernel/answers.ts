import { protocolVersion, type Content } from "../wire.js";
import type { CellRunner } from "./cell-runner.js";
import type { LiveOutput } from "./live-output.js";
import type { Answer, Request } from "./server.js";
import type { Engine } from "./tslab.js";

export interface AnswersParts {
  readonly engine: Engine;
  readonly runner: CellRunner;
  readonly output: LiveOutput;
  readonly version: string;
  readonly end: () => void;
}

/** What our kernel answers to each request of the Jupyter protocol; null to those it has not. */
export function answers(parts: AnswersParts): (request: Request) => Promise<Answer | null> {
  const { engine, runner, output, version, end } = parts;

  const execute = async ({ content, publish }: Request): Promise<Answer> => {
    const code = textIn(content, "code");
    const isSilent = content["silent"] === true;
    output.belongTo(publish);
    if (!isSilent) publish("execute_input", { code, execution_count: runner.count + 1 });
    const report = await runner.run(code, isSilent);
    const base = { execution_count: runner.count, user_expressions: {}, payload: [] };
    if (!report) return { type: "execute_reply", content: { status: "ok", ...base } };
    const { ename, evalue, traceback } = report;
    return {
      type: "execute_reply",
      content: { status: "error", ename, evalue, traceback, ...base },
      aborts: content["stop_on_error"] !== false,
    };
  };

  const complete = (content: Content): Content => {
    const code = textIn(content, "code");
    const { start, end, candidates } = engine.complete(code, unitsAt(code, content["cursor_pos"]));
    return {
      status: "ok",
      cursor_start: pointsAt(code, start),
      cursor_end: pointsAt(code, end),
      matches: candidates,
      metadata: {},
    };
  };

  const inspect = (content: Content): Content => {
    const code = textIn(content, "code");
    const text = engine.inspect(code, unitsAt(code, content["cursor_pos"]));
    const data = text === null ? {} : { "text/plain": text };
    return { status: "ok", found: text !== null, data, metadata: {} };
  };

  const isComplete = (content: Content): Content => {
    const { completed, indent } = engine.isComplete(textIn(content, "code"));
    return completed ? { status: "complete" } : { status: "incomplete", indent: indent ?? "" };
  };

  const kernelInfo = (): Content => ({
    status: "ok",
    protocol_version: protocolVersion,
    implementation: "stillwell",
    implementation_version: version,
    banner: `Stillwell ${version}: TypeScript ${engine.typescriptVersion} on Node ${process.versions.node}`,
    help_links: [],
    language_info: {
      name: "typescript",
      version: engine.typescriptVersion,
      mimetype: "text/typescript",
      file_extension: ".ts",
      // Front ends of two generations colour TypeScript by one or the other of these.
      codemirror_mode: { mode: "typescript", name: "javascript", typescript: true },
    },
  });

  return async (request) => {
    const { type, content } = request;
    switch (type) {
      case "execute_request":
        return execute(request);
      case "complete_request":
        return { type: "complete_reply", content: complete(content) };
      case "inspect_request":
        return { type: "inspect_reply", content: inspect(content) };
      case "is_complete_request":
        return { type: "is_complete_reply", content: isComplete(content) };
      case "kernel_info_request":
        return { type: "kernel_info_reply", content: kernelInfo() };
      case "comm_info_request":
        return { type: "comm_info_reply", content: { status: "ok", comms: {} } };
      case "history_request":
        return { type: "history_reply", content: { status: "ok", history: [] } };
      case "interrupt_request":
        runner.interrupt();
        return { type: "interrupt_reply", content: { status: "ok" } };
      case "shutdown_request": {
        const restart = content["restart"] === true;
        return { type: "shutdown_reply", content: { status: "ok", restart }, afterwards: end };
      }
      default:
        return null;
    }
  };
}

const textIn = (content: Content, field: string): string => {
  const x = content[field];
  return typeof x === "string" ? x : "";
};

// The protocol counts characters, the compiler counts UTF-16 units.
const unitsAt = (code: string, points: unknown): number =>
  Array.from(code)
    .slice(0, typeof points === "number" ? points : 0)
    .join("").length;
const pointsAt = (code: string, units: number): number => Array.from(code.slice(0, units)).length;
