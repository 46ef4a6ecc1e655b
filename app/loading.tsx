export default function Loading() {
  return (
    <p role="status" className="pt-16 text-muted">
      One moment …
    </p>
  );
}
