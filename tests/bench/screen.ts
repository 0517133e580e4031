import type { Line } from './report.ts';
export const screen = async (_root: string): Promise<Line[]> => [];
