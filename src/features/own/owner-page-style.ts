/**
 * A page for owners: larger letters than where professionals work, everything that is pressed or written in at
 * least 44 px high, wherever it comes from.
 */
export const OWNER_PAGE =
  'mx-auto max-w-[1168px] px-6 pt-7 pb-8 text-owner leading-owner max-sm:px-[18px] max-sm:pt-5 ' +
  '[&_button]:min-h-touch [&_button]:text-h3 [&_button.border]:px-5 [&_input]:min-h-touch [&_input]:text-h3 ' +
  '[&_select]:min-h-touch [&_select]:text-h3 [&_textarea]:text-h3 [&_label]:text-h3 ' +
  '[&_[role=alert]]:text-h3 [&_p[id]]:text-lead print:p-0 print:text-roomy';
