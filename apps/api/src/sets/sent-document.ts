import { readSetDocument, type SetDocument } from '@settlewright/geometry';
import { Problem, type ProblemField } from '../common/problem';
import { isStorableText } from '../common/text-field';

const MOST_FAULTS = 20;

/** Reads a document out of a request; what is wrong is named by its path under `document`. */
export function readSentDocument(sent: unknown): SetDocument {
  const unreadable = [...textFaults(sent, 'document')].slice(0, MOST_FAULTS);
  if (unreadable.length > 0) throw Problem.invalid(unreadable);
  const read = readSetDocument(sent);
  if (read.ok) return read.value;
  const { code, message, fields } = read.error;
  if (code === 'too-large') throw new Problem(413, 'document-too-large', message);
  const named = fields.map((field) => ({
    ...field,
    path: field.path ? `document.${field.path}` : 'document',
  }));
  throw new Problem(
    400,
    'invalid-document',
    message,
    named.length > 0 ? named : [{ path: 'document', code, message }],
  );
}

/** Characters that no field may hold and the database cannot keep. */
function* textFaults(value: unknown, path: string): Generator<ProblemField> {
  if (typeof value === 'string' && !isStorableText(value, true)) {
    yield { path, code: 'plain-text', message: `${path} may not hold control characters` };
  }
  if (typeof value !== 'object' || value === null) return;
  for (const [key, entry] of Object.entries(value)) {
    if (!isStorableText(key)) {
      yield { path, code: 'plain-text', message: `a key under ${path} may not hold control characters` };
    }
    yield* textFaults(entry, `${path}.${key}`);
  }
}
