/** Filled marks for the signs that are needed, empty ones for the rest: ●●○. */
export function SignMarks({ needed, total, label }: { needed: number; total: number; label: string }) {
  const filled = Math.min(needed, total);
  return (
    <span role="img" aria-label={label} className="text-heading tracking-widest">
      {'●'.repeat(filled)}
      {'○'.repeat(Math.max(0, total - filled))}
    </span>
  );
}
