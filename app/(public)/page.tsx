export default function Home() {
  return <h1>Combwood</h1>;
}
