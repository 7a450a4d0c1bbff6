/** A printed length, `95.2 cm` or `37 3/8`, on one line; the fraction of an inch is drawn as one. */
export function Length({ text }: { text: string }) {
  const parts = /^(.*?)(\d+\/\d+)(.*)$/.exec(text);
  return (
    <span className="length">
      {parts ? (
        <>
          {parts[1]}
          <span className="fraction">{parts[2]}</span>
          {parts[3]}
        </>
      ) : (
        text
      )}
    </span>
  );
}
