/** What text inputs, selects and text areas share, so that they line up in a row. */
export const controlLook =
  'touch field-text w-full min-w-0 rounded-control border border-dusk/70 bg-card px-3 py-1.5 text-ink ' +
  'hover:border-ink aria-invalid:border-stop aria-invalid:bg-stop-wash ' +
  'disabled:border-hem disabled:bg-linen disabled:text-dusk [&[readonly]]:bg-linen';

/** The box of a checkbox and, rounded, of a radio button. */
export const tickBox =
  'peer mt-0.5 size-4.5 shrink-0 appearance-none border border-dusk bg-card checked:border-ink checked:bg-ink ' +
  'disabled:border-thread disabled:bg-linen aria-invalid:border-stop true-colour';
