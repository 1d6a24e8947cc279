export default function SignInPage() {
  return null;
}
