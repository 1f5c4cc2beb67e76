import { formatDayTime } from '@/lib/format';
import type { ShiftNote } from '@/lib/plants/schema';

/** The last shift's words: time in the margin, the note on the right of its rule. */
export function ShiftNotes({ notes, timeZone }: { notes: readonly ShiftNote[]; timeZone: string }) {
  return (
    <section aria-labelledby="shift-notes">
      <h2 id="shift-notes" className="text-xl">
        Shift notes
      </h2>
      {notes.length === 0 ? (
        <p className="mt-2 text-ink-soft">No shift has left a note yet.</p>
      ) : (
        <ul className="mt-2">
          {notes.map((note) => (
            <li key={note.id} className="margin-rule mb-3 pl-4">
              <p className="text-sm text-ink-soft">
                {formatDayTime(note.writtenAt, timeZone)}, {note.author}
              </p>
              <p>{note.body}</p>
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}
