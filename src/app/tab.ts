/** What belongs to this tab alone, and ids that no other tab makes. */

const KEY = 'headwright-project';

/** Which project this tab has at hand, kept through a reload. A browser may refuse; the newest project is opened then. */
export const tab = {
  recall(): string | undefined {
    try {
      return window.sessionStorage.getItem(KEY) ?? undefined;
    } catch {
      return undefined;
    }
  },
  note(id: string): void {
    try {
      window.sessionStorage.setItem(KEY, id);
    } catch {
      // Only a habit is lost.
    }
  },
};

/** 128 random bits as text; made so that it also works on a page that is not secure. */
export const newId = (): string =>
  Array.from(crypto.getRandomValues(new Uint8Array(16)), (byte) => byte.toString(16).padStart(2, '0')).join('');
