/** Stands where the output or the notebook gives no value: never 0, never a dash that could be read as minus. */
export function Absent({ word = 'absent' }: { word?: string }) {
  return <i className="font-normal text-ink-3">{word}</i>;
}
