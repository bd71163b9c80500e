export function KeyCap({ children }: { children: string }) {
  return <kbd>{children}</kbd>
}
