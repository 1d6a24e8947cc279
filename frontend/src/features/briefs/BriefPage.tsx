export default function BriefPage() {
  return null;
}
