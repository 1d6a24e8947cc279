export default function BriefsPage() {
  return null;
}
