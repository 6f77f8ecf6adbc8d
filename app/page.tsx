export default function Home() {
  return (
    <main id="main" className="p-8">
      <h1>Combwood</h1>
    </main>
  );
}
