import { fileSize } from '../../../lib/file-size';

/** What is taken; the server looks into the bytes and decides. */
export const TAKEN_TYPES = ['application/pdf', 'image/png', 'image/jpeg'] as const;
export const LARGEST_BYTES = 20 * 1024 * 1024;

/** Why a file would not be taken, said before it is sent; null when nothing speaks against it. */
export function whyNot(file: Pick<File, 'name' | 'size' | 'type'>): string | null {
  if (file.size === 0) return `${file.name} is empty.`;
  if (file.size > LARGEST_BYTES)
    return `${file.name} has ${fileSize(file.size)}; up to ${fileSize(LARGEST_BYTES)} are taken.`;
  const known = (TAKEN_TYPES as readonly string[]).includes(file.type);
  return known ? null : `${file.name} is no PDF, PNG or JPEG.`;
}
