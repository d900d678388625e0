namespace TwoPhase.Advisory;

/// <summary>What the tests of a reconciliation come to.</summary>
public enum ReconciliationVerdict
{
    /// <summary>No answer.</summary>
    None,

    /// <summary>No measurement checks another: errors cannot be seen.</summary>
    NotChecked,

    /// <summary>The measurements agree within their uncertainties.</summary>
    Agree,

    /// <summary>One instrument, or one of a set that cannot be told apart, disagrees with the rest; without it, or without several named one after the other, the rest agrees.</summary>
    FaultNamed,

    /// <summary>The measurements disagree, and no instrument stands out that would explain it: uncertainties stated too small, a generator not at rest, several errors at once.</summary>
    Disagree,
}
