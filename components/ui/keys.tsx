/** A key that acts here, shown where it acts: `<Keys of="K" />`, `<Keys of="Shift K" />`. */
export function Keys({ of }: { of: string }) {
  return (
    <span className="no-print ms-1.5 inline-flex gap-0.5 align-baseline">
      {of.split(' ').map((key) => (
        <kbd
          key={key}
          className="inline-block min-w-5 rounded-leaf border border-edge bg-field px-1 text-center text-[0.75rem] leading-snug text-grey"
        >
          {key}
        </kbd>
      ))}
    </span>
  );
}
