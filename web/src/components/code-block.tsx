import { CopyButton } from './copy-button.tsx';

/** Text to be copied as it stands; long lines wrap rather than scroll the page. */
export function CodeBlock({ label, text }: { label: string; text: string }) {
  return (
    <figure className="border border-hair bg-well">
      <figcaption className="flex items-center justify-between border-b border-hair py-1 pr-1 pl-3"><span className="lettering text-soft">{label}</span><CopyButton text={text} what={label} /></figcaption>
      <pre className="px-3 py-2 break-all whitespace-pre-wrap">{text}</pre>
    </figure>
  );
}
