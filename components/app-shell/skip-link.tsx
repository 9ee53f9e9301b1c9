/** The first stop of the keyboard: past the navigation to the page. The page's main element has the id "content". */
export function SkipLink() {
  return (
    <a
      href="#content"
      className="rounded-control bg-ink text-on-ink fixed top-2 left-2 z-50 -translate-y-20 px-4 py-2.5 font-[600] focus:translate-y-0 print:hidden"
    >
      Skip to the page
    </a>
  );
}
