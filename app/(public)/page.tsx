export default function LandingPage() {
  return <h1 className="type-page">Raglan</h1>;
}
