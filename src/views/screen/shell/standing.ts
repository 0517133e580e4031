/** Sentences for what the program says about itself: causes why nothing is kept, and notices. */
import type { Notice } from '../../../state/workbench.ts';

const CAUSES: Readonly<Record<string, string>> = {};

export const causeWords = (cause: string): string => CAUSES[cause] ?? cause;

export const noticeWords = ({ code, detail }: Notice): string => [code, ...Object.values(detail)].join(' ');
