const LARGEST_BYTES = 15 * 1024 * 1024;
const NAMES = /\.(pdf|png|jpe?g)$/i;

/** What can be seen to be wrong with a file before it is sent; its content is looked into by the server. */
export function fileError(file: Pick<File, 'name' | 'size'> | null): string | undefined {
  if (file === null) return 'Choose a file.';
  if (!NAMES.test(file.name)) return 'A document is a PDF, a PNG or a JPEG.';
  if (file.size === 0) return 'This file is empty.';
  return file.size > LARGEST_BYTES ? 'A document has 15 MB at most.' : undefined;
}
