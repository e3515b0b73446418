/** That this screen hears the server. When it does not, a band says so instead. */
export function LiveMark({ isConnecting }: { isConnecting: boolean }) {
  return (
    <p className="flex items-center gap-2 text-label text-ink-muted" role="status">
      <span
        className="size-4 rounded-full border-3 border-ink-muted data-[live=true]:bg-ink"
        data-live={!isConnecting}
      />
      {isConnecting ? 'connecting' : 'live'}
    </p>
  );
}
