namespace MemberScan.Part21.Index;

/// <summary>What is known of an instance without reading it again.</summary>
[Flags]
internal enum InstanceFlags : byte
{
    None = 0,

    /// <summary>Of the external mapping: several partial types in one.</summary>
    Complex = 1,

    /// <summary>Its parameters cannot be told apart.</summary>
    Damaged = 2,

    /// <summary>An instance further up has the same number.</summary>
    Duplicate = 4,
}
