namespace Boltup.Config.Binding;

/// <summary>A map from names that the user chooses to values of one kind.</summary>
/// <param name="What">What one name stands for, such as <c>mount</c>.</param>
/// <param name="IsDotted">Whether it becomes part of a dotted name, so that it holds no full stop and is not <c>ground</c>.</param>
/// <param name="MakesFileNames">Whether output files are named after it, so that two names may not give the same file name.</param>
/// <param name="Minimum">Least number of names.</param>
public sealed record NamedKind(string What, ValueKind Item, bool IsDotted = false, bool MakesFileNames = false, int Minimum = 0) : ValueKind
{
    public override string Expected => $"a map from {What} names to values";
}
