/** The name with its crease: two strokes of a fold that run out. */
export function Wordmark() {
  return (
    <span className="inline-flex items-center gap-2 text-lg font-bold text-ink">
      <svg viewBox="0 0 28 28" width="28" height="28" aria-hidden className="text-chalk">
        <path
          d="M3 21C9 20 13 15 15 4"
          fill="none"
          stroke="currentColor"
          strokeWidth="2.6"
          strokeLinecap="round"
        />
        <path
          d="M11 24c6-1 11-6 14-13"
          fill="none"
          stroke="currentColor"
          strokeWidth="2.6"
          strokeLinecap="round"
          opacity=".65"
        />
        <path
          d="M20 25c2-1 4-3 5-6"
          fill="none"
          stroke="currentColor"
          strokeWidth="2.6"
          strokeLinecap="round"
          opacity=".35"
        />
      </svg>
      Ruckle
    </span>
  );
}
