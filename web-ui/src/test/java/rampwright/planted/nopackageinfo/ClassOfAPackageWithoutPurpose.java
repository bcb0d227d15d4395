package rampwright.planted.nopackageinfo;

/** Lives in a package that does not say what it is for. */
public final class ClassOfAPackageWithoutPurpose {}
