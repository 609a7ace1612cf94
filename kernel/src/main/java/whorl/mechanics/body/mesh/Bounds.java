package whorl.mechanics.body.mesh;

/** The box around triangles, in the coordinates of their file. */
record Bounds(
    double leastX, double leastY, double leastZ, double mostX, double mostY, double mostZ) {
  boolean contains(Bounds inner) {
    return leastX <= inner.leastX
        && leastY <= inner.leastY
        && leastZ <= inner.leastZ
        && mostX >= inner.mostX
        && mostY >= inner.mostY
        && mostZ >= inner.mostZ;
  }

  /** The longest side. */
  double size() {
    return Math.max(mostX - leastX, Math.max(mostY - leastY, mostZ - leastZ));
  }

  double middleX() {
    return (leastX + mostX) / 2;
  }

  double middleY() {
    return (leastY + mostY) / 2;
  }

  double middleZ() {
    return (leastZ + mostZ) / 2;
  }

  /** The middle as a message shows it. */
  String middle() {
    return "(" + middleX() + ", " + middleY() + ", " + middleZ() + ")";
  }
}
