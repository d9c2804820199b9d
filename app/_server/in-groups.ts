import "server-only";

/**
 * Makes of a question about many keys at once one about a single key: whoever asks while an answer is
 * under way waits for it and is asked for with all who came meanwhile. Alone, nobody waits. An answer
 * is never older than its question.
 */
export function inGroups<V>(
  askAll: (keys: readonly string[]) => Promise<ReadonlyMap<string, V>>,
): (key: string) => Promise<V | undefined> {
  let isUnderWay = false;
  let next: {
    keys: Set<string>;
    answer: Promise<ReadonlyMap<string, V>>;
    begin: () => void;
  } | null = null;

  function openNext() {
    const keys = new Set<string>();
    let begin = () => undefined as undefined;
    const begun = new Promise<void>((resolve) => {
      begin = () => void resolve();
    });
    const answer = begun.then(() => askAll([...keys])).finally(advance);
    return { keys, answer, begin };
  }

  function advance(): void {
    isUnderWay = next !== null;
    const group = next;
    next = null;
    group?.begin();
  }

  return async (key) => {
    next ??= openNext();
    next.keys.add(key);
    const { answer } = next;
    if (!isUnderWay) advance();
    return (await answer).get(key);
  };
}
