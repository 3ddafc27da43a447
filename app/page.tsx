export default function Home() {
  return <main>Carryover</main>;
}
