/** A dashed outline with words: these numbers are sealed. */
export function SealedMark({ children = 'sealed' }: { children?: string }) {
  return <span className="sealed-mark">{children}</span>;
}
