namespace MemberScan.Model.Verdicts;

/// <summary>Why a candidate was not checked: the closed list.</summary>
public enum ReasonCode
{
    /// <summary>No body and no profile at all.</summary>
    NoSection,

    /// <summary>A body without a parametric section (brep, mesh).</summary>
    SectionNotParametric,

    /// <summary>A section kind that is not covered.</summary>
    SectionNotCovered,

    /// <summary>Dimensions that make no section.</summary>
    SectionInvalid,

    /// <summary>A mesh that could be recognised, but the settings do not ask for it.</summary>
    MeshNotAllowed,

    /// <summary>A wall as thick as the radius, or thicker.</summary>
    WallOverRadius,

    /// <summary>No strength from properties and no known grade.</summary>
    NoStrength,

    /// <summary>A strength that cannot be meant (unit slip).</summary>
    StrengthImplausible,

    /// <summary>A material for which the limits do not hold (concrete, timber, glass …).</summary>
    MaterialNotCovered,

    /// <summary>No section forces for the member in any source.</summary>
    NoForces,

    /// <summary>Section forces with components missing.</summary>
    ForcesIncomplete,

    /// <summary>Only single load cases and no combination of them.</summary>
    NoCombination,

    /// <summary>Stations that do not reach both ends or leave a larger value in between possible.</summary>
    StationsTooCoarse,

    /// <summary>A situation that says neither service nor design, and no service limit to be cautious with.</summary>
    KindUnknown,

    /// <summary>A situation of a kind for which the basis has no limit.</summary>
    KindWithoutLimit,

    /// <summary>A length that sources or trimming leave open.</summary>
    LengthAmbiguous,

    /// <summary>Local axes that cannot be told where they matter.</summary>
    AxesUnknown,

    /// <summary>A placement that is not supported.</summary>
    PlacementNotSupported,

    /// <summary>A unit that the model does not name.</summary>
    UnitMissing,

    /// <summary>Forces whose sign convention is not known.</summary>
    ConventionUnknown,

    /// <summary>A threaded rod without thread data.</summary>
    ThreadUnknown,

    /// <summary>Compression beyond 4 % of the Euler load without a stability check, or no modulus to tell.</summary>
    StabilityNotChecked,

    /// <summary>A compressed wall beyond class 3.</summary>
    SlenderWall,

    /// <summary>A switched-on check that could not be evaluated.</summary>
    CheckNotEvaluated,

    /// <summary>The record of the element, or one it needs, is damaged.</summary>
    DamagedRecord,
}
