export default function Page() {
  return (
    <main>
      <h1>Longhence</h1>
    </main>
  )
}
