/** A pseudonym on a seat; on a narrow seat its number goes on a line of its own and is the larger part. */
export function SeatLabel({ children: name }: { readonly children: string }) {
  const cut = name.lastIndexOf('-') + 1;
  if (cut <= 0 || cut === name.length)
    return (
      <span className="seat-label">
        <span className="seat-tail">{name}</span>
      </span>
    );
  return (
    <span className="seat-label">
      <span className="seat-head">{name.slice(0, cut)}</span>
      <span className="seat-tail">{name.slice(cut)}</span>
    </span>
  );
}
