/** Pairleaf's mark: two leaves, one full, one in outline. */
export function Mark({ className = 'h-[22px] w-6' }: { readonly className?: string }) {
  return (
    <svg className={className} viewBox="0 0 24 22" aria-hidden="true">
      <path d="M11 21V8.5A7.5 7.5 0 0 0 3.5 1H1v12.5A7.5 7.5 0 0 0 8.5 21Z" fill="currentColor" />
      <path
        d="M13.75 20.25V9A7.25 7.25 0 0 1 21 1.75h1.25V13A7.25 7.25 0 0 1 15 20.25Z"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.5"
      />
    </svg>
  );
}
