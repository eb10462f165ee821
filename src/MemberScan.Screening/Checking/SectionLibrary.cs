using System.Collections.Concurrent;
using System.Globalization;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Screening.Checking;

/// <summary>Stress fields of the sections in use, made once per section, shear model and ν and shared by all members.</summary>
internal sealed class SectionLibrary
{
    /// <summary>Largest closure error of closed forms and series [-].</summary>
    private const double ClosureTolerance = 1e-6;

    /// <summary>Largest closure error of numerical fields [-].</summary>
    private const double NumericalClosureTolerance = 1e-3;

    private readonly ConcurrentDictionary<(CrossSection Section, ShearModel Model, double Poisson), (StressField? Field, string WhyNot)> _fields = new();

    /// <summary>Properties of a section.</summary>
    public SectionProperties Properties(CrossSection section) =>
        Field(section, ShearModel.Elementary, 0).Field?.Properties ?? SectionProperties.Of(section);

    /// <summary>The field of a section in a shear model, or why there is none.</summary>
    public (StressField? Field, string WhyNot) Field(CrossSection section, ShearModel model, double poisson)
    {
        // The elementary model does not depend on ν: one field serves all.
        var key = (section, model, model == ShearModel.Elementary ? 0 : poisson);
        return _fields.GetOrAdd(key, static k =>
            StressField.TryCreate(k.Section, k.Model, k.Poisson, out var field, out var whyNot) ? Closing(field) : (null, whyNot));
    }

    /// <summary>An elasticity field that does not give back its section forces is not used; elementary models need not close.</summary>
    private static (StressField? Field, string WhyNot) Closing(StressField field) =>
        field.Model == ShearModel.Elementary || field.Closure.LargestError <= (field.NumericalError is null ? ClosureTolerance : NumericalClosureTolerance)
            ? (field, "")
            : (null, string.Create(CultureInfo.InvariantCulture, $"elasticity not available: the field misses its section forces by {field.Closure.LargestError:0.0E+0}"));
}
