import {
  isMultipartRequest,
  MaxFileSizeExceededError,
  MaxTotalSizeExceededError,
  parseMultipartRequest,
} from "@remix-run/multipart-parser";
import { Invalid } from "./errors.ts";
import { rememberForm } from "./http.server.ts";

export interface Upload {
  fileName: string;
  bytes: Buffer;
}

const MEGABYTE = 1024 * 1024;

/**
 * Reads a form with one file, part by part, never more of the file than `mostBytes`. What was typed is remembered whatever
 * becomes of the file, so that a refused form comes back filled in (the file's input stands last in its form).
 * @throws Invalid at `field` when the file is missing, empty or too large
 */
export async function readUpload(
  request: Request,
  field: string,
  mostBytes: number,
): Promise<{ form: FormData; upload: Upload }> {
  const form = new FormData();
  rememberForm(request, form);
  if (!isMultipartRequest(request)) throw new Invalid({ [field]: ["Choose a file."] });
  let upload: Upload | null = null;
  try {
    for await (const part of parseMultipartRequest(request, { maxFileSize: mostBytes, maxParts: 60 })) {
      if (part.name === field && part.isFile) {
        upload = { fileName: plainName(part.filename), bytes: Buffer.from(part.bytes) };
      } else if (part.name) form.append(part.name, part.text);
    }
  } catch (error) {
    throw new Invalid({ [field]: [refusal(error, mostBytes)] });
  }
  if (!upload || upload.bytes.byteLength === 0) throw new Invalid({ [field]: ["Choose a file that is not empty."] });
  return { form, upload };
}

function refusal(error: unknown, mostBytes: number): string {
  if (error instanceof MaxFileSizeExceededError || error instanceof MaxTotalSizeExceededError) {
    return `This file is too large: at most ${Math.floor(mostBytes / MEGABYTE)} MB.`;
  }
  return "The file did not arrive whole. Send it again.";
}

/** The last part of whatever a browser calls a file, without what could mislead. */
function plainName(name: string | undefined): string {
  const last = (name ?? "").split(/[\\/]/).at(-1) ?? "";
  // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what is taken out
  return last.replace(/[\u0000-\u001f\u007f]/g, "").slice(-200) || "file";
}
