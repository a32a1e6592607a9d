import { lazy, Suspense } from 'react';
import { SkeletonText } from './skeleton';

export interface RichTextProps {
  id: string;
  label: string;
  /** The text to begin with; later changes of it are taken over only when `resetKey` changes. */
  html: string;
  resetKey?: string | number;
  onChange: (html: string) => void;
  describedBy?: string | undefined;
}

const Editor = lazy(() => import('./rich-text-editor'));

/** An editor for headings, lists and emphasis; its code is loaded when it is first shown. */
export function RichText(props: RichTextProps) {
  return (
    <Suspense fallback={<SkeletonText lines={8} />}>
      <Editor key={props.resetKey} {...props} />
    </Suspense>
  );
}
