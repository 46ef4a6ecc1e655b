export default function HomePage() {
  return <h1>Smirr</h1>;
}
