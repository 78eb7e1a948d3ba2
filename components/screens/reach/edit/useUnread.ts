import { useState } from 'react';

/** A cell of the table of points. */
export interface Cell {
  sectionId: string;
  row: number;
  column: 0 | 1;
}

const keyOf = ({ sectionId, row, column }: Cell) => `${row}/${column}/${sectionId}`;

/** What was typed into cells and is no number: it stays there to be mended, and nothing is saved meanwhile. */
export function useUnread() {
  const [texts, setTexts] = useState<Readonly<Record<string, string>>>({});
  return {
    count: Object.keys(texts).length,
    at: (cell: Cell): string | undefined => texts[keyOf(cell)],
    /** null: it can be read, or is gone. */
    set: (cell: Cell, text: string | null) =>
      setTexts(({ [keyOf(cell)]: _, ...others }) =>
        text === null ? others : { ...others, [keyOf(cell)]: text },
      ),
    clear: () => setTexts({}),
  };
}

export type Unread = ReturnType<typeof useUnread>;
