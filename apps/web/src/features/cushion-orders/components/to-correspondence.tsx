/** Where the correspondence of an order begins on its page. */
export const CORRESPONDENCE_ID = 'correspondence';

/** On a narrow page the correspondence stands below all cushions: a way down to it. */
export function ToCorrespondence({ words }: { words: string }) {
  return (
    <a className="link inline-flex min-h-11 items-center desk:hidden" href={`#${CORRESPONDENCE_ID}`}>
      {words}
    </a>
  );
}
