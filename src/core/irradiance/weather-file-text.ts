/** What the platform's TextDecoder offers, without the platform's type. */
export type TextDecoderLike = new (
  label: string,
  options?: { fatal?: boolean },
) => { decode(bytes: Uint8Array): string };

/**
 * Text of a weather file: UTF-8 where its bytes are that, else byte by byte (ISO 8859-1), as old files are written; one
 * odd letter in a town's name must not stop a file. `Decoder` is the platform's TextDecoder.
 */
export function weatherFileText(bytes: Uint8Array, Decoder: TextDecoderLike): string {
  try {
    return new Decoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new Decoder('latin1').decode(bytes);
  }
}
