export default function TrainPage() {
  return null;
}
