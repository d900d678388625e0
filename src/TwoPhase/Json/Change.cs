namespace TwoPhase.Json;

/// <summary>A thing that is made and then changed by the members of a document that are there, each change with its own JSON path.</summary>
internal readonly struct Change<T>(Place place, T made)
{
    public T Made { get; } = made;

    public Change<T> With<TMember>(string name, TMember? member, Func<T, TMember, Place, T> change)
    {
        if (member is null) return this;
        Place at = place.Member(name);
        T before = Made;
        return new(place, at.Make(() => change(before, member, at)));
    }
}
