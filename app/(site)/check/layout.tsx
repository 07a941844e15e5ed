export default function CheckLayout({ children }: { children: React.ReactNode }) {
  return (
    <main id="main" className="w">
      {children}
    </main>
  )
}
