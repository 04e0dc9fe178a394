import { setNonce } from 'get-nonce';

/**
 * Hands the response's nonce to the libraries that write a style element (dialogs lock the page's
 * scroll with one); without it the page's own policy would refuse it. Gives the nonce for the parts
 * that take it as a property.
 */
export function adoptNonce(): string | undefined {
  const meta = document.querySelector<HTMLMetaElement>('meta[property="csp-nonce"]');
  const nonce = meta?.nonce || meta?.getAttribute('nonce') || undefined;
  if (nonce) setNonce(nonce);
  return nonce;
}
