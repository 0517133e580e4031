/** Where the working of a figure stands in the page, and the way there. */
export const workingId = (group: string, line: string): string => `working-${group}-${line}`;

/** Opens the line of a figure, at its duty point or else that of the meter, and takes the reader there. */
export function openWorking(group: string, line: string): void {
  const target = document.getElementById(workingId(group, line)) ?? document.getElementById(workingId('meter', line));
  if (target === null) return;
  for (let fold = target.closest('details'); fold !== null; fold = fold.parentElement?.closest('details') ?? null)
    fold.open = true;
  target.scrollIntoView({ block: 'center' });
  target.querySelector<HTMLElement>('summary')?.focus();
}
