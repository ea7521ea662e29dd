/** The text of a file, or why it is none. */
export type DecodedText = { text: string; encoding: string } | { problem: string }

/**
 * Decodes the bytes of a CSV file: by its byte-order mark, else as UTF-8, else as Windows-1252, in
 * which every byte is something.
 */
export function decodeText(bytes: Uint8Array): DecodedText {
  // What spreadsheets save by default is a zip archive.
  if (bytes[0] === 0x50 && bytes[1] === 0x4b && bytes[2] === 0x03) {
    return {
      problem:
        'This is a spreadsheet workbook, not a CSV file. Save it as CSV in the spreadsheet, or copy its cells and paste them below.',
    }
  }
  const marked =
    (bytes[0] === 0xff && bytes[1] === 0xfe && 'utf-16le') ||
    (bytes[0] === 0xfe && bytes[1] === 0xff && 'utf-16be')
  if (marked) return { text: new TextDecoder(marked).decode(bytes), encoding: marked }
  if (bytes.includes(0)) {
    return { problem: 'This file is not text. Choose a CSV file, or paste the cells below.' }
  }
  try {
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(bytes), encoding: 'utf-8' }
  } catch {
    return { text: new TextDecoder('windows-1252').decode(bytes), encoding: 'windows-1252' }
  }
}
