import { FAMILIES } from '@/generators';

export default function HomePage() {
  return (
    <main>
      <h1>Bendwell</h1>
      <ul>
        {FAMILIES.map(({ about }) => (
          <li key={about.id}>{about.name}</li>
        ))}
      </ul>
    </main>
  );
}
