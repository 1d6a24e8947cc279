export default function TrainsPage() {
  return null;
}
