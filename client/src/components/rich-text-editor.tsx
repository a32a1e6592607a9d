import { type Editor, EditorContent, useEditor, useEditorState } from '@tiptap/react';
import { StarterKit } from '@tiptap/starter-kit';
import type { RichTextProps } from './rich-text';

const extensions = [
  StarterKit.configure({
    heading: { levels: [2, 3] },
    code: false,
    codeBlock: false,
    link: false,
    underline: false,
    strike: false,
    horizontalRule: false,
  }),
];

const tools: { label: string; name: string; level?: number; run: (editor: Editor) => void }[] = [
  {
    label: 'Heading',
    name: 'heading',
    level: 2,
    run: (one) => one.chain().focus().toggleHeading({ level: 2 }).run(),
  },
  {
    label: 'Subheading',
    name: 'heading',
    level: 3,
    run: (one) => one.chain().focus().toggleHeading({ level: 3 }).run(),
  },
  { label: 'Bold', name: 'bold', run: (one) => one.chain().focus().toggleBold().run() },
  { label: 'Italic', name: 'italic', run: (one) => one.chain().focus().toggleItalic().run() },
  { label: 'List', name: 'bulletList', run: (one) => one.chain().focus().toggleBulletList().run() },
  {
    label: 'Numbered list',
    name: 'orderedList',
    run: (one) => one.chain().focus().toggleOrderedList().run(),
  },
  { label: 'Quotation', name: 'blockquote', run: (one) => one.chain().focus().toggleBlockquote().run() },
];

export default function RichTextEditor({ id, label, html, onChange, describedBy }: RichTextProps) {
  const editor = useEditor({
    extensions,
    content: html,
    onUpdate: ({ editor: changed }) => {
      onChange(changed.isEmpty ? '' : changed.getHTML());
    },
    editorProps: {
      attributes: {
        id,
        role: 'textbox',
        'aria-multiline': 'true',
        'aria-label': label,
        ...(describedBy === undefined ? {} : { 'aria-describedby': describedBy }),
        class: 'rich-text-input rich-text',
      },
    },
  });
  return (
    <div className="rich-text-frame">
      <Toolbar editor={editor} />
      <EditorContent editor={editor} />
    </div>
  );
}

function Toolbar({ editor }: { editor: Editor }) {
  const active = useEditorState({
    editor,
    selector: ({ editor: now }) =>
      tools.map((tool) => now.isActive(tool.name, tool.level === undefined ? {} : { level: tool.level })),
  });
  return (
    <div className="rich-text-tools" role="group" aria-label="Format">
      {tools.map((tool, index) => (
        <button
          key={tool.label}
          type="button"
          aria-pressed={active[index]}
          onClick={() => {
            tool.run(editor);
          }}
        >
          {tool.label}
        </button>
      ))}
    </div>
  );
}
