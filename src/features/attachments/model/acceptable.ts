/** What is taken; the server looks into the bytes and decides. */
export const TAKEN_TYPES = ['application/pdf', 'image/png', 'image/jpeg'] as const;
export const LARGEST_BYTES = 20_000_000;

/** Why a file would not be taken, said before it is sent; null when nothing speaks against it. */
export function whyNot(file: Pick<File, 'name' | 'size' | 'type'>): string | null {
  if (file.size === 0) return `${file.name} is empty.`;
  if (file.size > LARGEST_BYTES)
    return `${file.name} is larger than 20\u2009MB; files up to 20\u2009MB are taken.`;
  const known = (TAKEN_TYPES as readonly string[]).includes(file.type);
  return known ? null : `${file.name} is no PDF, PNG or JPEG.`;
}
