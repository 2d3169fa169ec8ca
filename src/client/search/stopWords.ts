/** Words that carry no meaning here; "a", the scale factor, is treated where it stands. */
export const STOP_WORDS: ReadonlySet<string> = new Set(
  'an and are at be by can did do does for from give had has have i in is it its me my now of on or please s show tell that the their there this to was were what when where which will with z'.split(
    ' ',
  ),
);
