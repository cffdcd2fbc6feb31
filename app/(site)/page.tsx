/** The first page. */
export default function HomePage() {
  return (
    <div className="page-measure py-8">
      <h1>Where do the pieces belong?</h1>
      <p className="mt-1 max-w-130 text-soft">
        Waypost counts a position square by square and says what follows, in sentences you can check with a finger on
        the board.
      </p>
    </div>
  );
}
