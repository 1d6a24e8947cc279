export default function AcceptInvitePage() {
  return null;
}
