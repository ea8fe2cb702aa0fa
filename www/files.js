// Books as files: a copy out, and back in.

export const MOST_BYTES = 10_000_000;

/** @param {string} title */
function fileName(title) {
  const plain = title.normalize('NFKD').replace(/[^A-Za-z0-9]+/g, '-').replace(/^-+|-+$/g, '').toLowerCase();
  return `${plain.slice(0, 60) || 'bridge'}.girderbook.json`;
}

/**
 * Hands a copy out: the share sheet where there is one for files, a download elsewhere.
 * @param {string} title
 * @param {string} text
 * @returns {Promise<boolean>} whether it left, as far as the browser tells
 */
export async function copyOut(title, text) {
  const file = new File([text], fileName(title), { type: 'application/json' });
  const touch = matchMedia('(pointer: coarse)').matches;
  if (touch && navigator.canShare?.({ files: [file] })) {
    try {
      await navigator.share({ files: [file], title });
      return true;
    } catch (error) {
      if (error instanceof DOMException && error.name === 'AbortError') return false;
    }
  }
  const url = URL.createObjectURL(file);
  const anchor = document.createElement('a');
  anchor.href = url;
  anchor.download = file.name;
  anchor.click();
  setTimeout(() => URL.revokeObjectURL(url), 60_000);
  return true;
}

/**
 * The text of a chosen file, or why it is not read.
 * @param {File} file
 * @returns {Promise<{text: string} | {refused: string}>}
 */
export async function textOf(file) {
  if (file.size > MOST_BYTES) {
    return { refused: 'This file is larger than 10 MB; a book is never that large. Choose the book file.' };
  }
  try {
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(await file.arrayBuffer()) };
  } catch {
    return { refused: 'This file is not text. Choose a book file that ends in .girderbook.json.' };
  }
}
