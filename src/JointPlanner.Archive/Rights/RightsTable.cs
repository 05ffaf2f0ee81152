using System.Globalization;
using System.Text;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;

namespace JointPlanner.Archive.Rights;

/// <summary>A role may do an act.</summary>
/// <param name="Own">On structures of the person's own organisation (for acts of an organisation: in it).</param>
/// <param name="Other">On another organisation's structure that is opened to the person's organisation in this role.</param>
public sealed record Right(Act Act, Role Role, bool Own, bool Other);

/// <summary>Who may do what, as data. What stands in no row may nobody do.</summary>
public static class RightsTable
{
    public static readonly IReadOnlyList<Right> Rows =
    [
        .. Both(Act.ReadIssued, Role.Designer, Role.Checker, Role.Contractor, Role.Owner),
        .. Both(Act.ReadWork, Role.Designer, Role.Checker, Role.Owner),
        .. Both(Act.Edit, Role.Designer),
        .. Both(Act.Begin, Role.Designer),
        .. Both(Act.Freeze, Role.Designer),
        .. Both(Act.Return, Role.Checker),
        .. Both(Act.Accept, Role.Checker),
        .. Both(Act.Sign, Role.Designer, Role.Checker),
        .. Both(Act.Issue, Role.Designer), .. OwnOnly(Act.Issue, Role.Owner),
        .. Both(Act.Withdraw, Role.Designer), .. OwnOnly(Act.Withdraw, Role.Owner),
        .. Both(Act.MakeLink, Role.Designer), .. OwnOnly(Act.MakeLink, Role.Owner),
        .. Both(Act.RevokeLink, Role.Designer), .. OwnOnly(Act.RevokeLink, Role.Owner),
        .. Both(Act.RecordSetting, Role.Designer, Role.Contractor),
        .. Both(Act.AcceptSetting, Role.Designer),
        .. Both(Act.RecordReading, Role.Designer, Role.Contractor), .. OwnOnly(Act.RecordReading, Role.Owner),
        .. OwnOnly(Act.GiveAccess, Role.Owner),
        .. OwnOnly(Act.CloseStructure, Role.Owner),
        .. OwnOnly(Act.ReadAudit, Role.Owner),
        .. OwnOnly(Act.CreateStructure, Role.Designer, Role.Owner),
        .. OwnOnly(Act.ConfirmValue, Role.Owner),
        .. OwnOnly(Act.RevokeConfirmation, Role.Owner),
        .. OwnOnly(Act.SetRule, Role.Owner),
    ];

    /// <summary>Acts of the installation's administrator, who has no reading of calculations by that.</summary>
    public static readonly IReadOnlyList<Act> OfAdministrator =
    [
        Act.ManageAccounts, Act.ManageOrganisations, Act.ConfirmCertificate, Act.ManageRoots, Act.ManageSeal, Act.ManageTimeStamp,
        Act.ManagePublicAddress, Act.ReadInstallationAudit,
    ];

    /// <summary>Acts that everybody may do for themselves.</summary>
    public static readonly IReadOnlyList<Act> OfOneself = [Act.RegisterCertificate, Act.ChangePassword, Act.SetPassword];

    /// <summary>Acts for which the password is typed again, whoever does them.</summary>
    public static readonly IReadOnlyList<Act> PasswordAgain =
    [
        Act.Sign, Act.Issue, Act.Withdraw, Act.GiveAccess, Act.ConfirmValue, Act.RevokeConfirmation, Act.SetRule, Act.ChangePassword,
        Act.ManageAccounts, Act.ManageOrganisations, Act.ConfirmCertificate, Act.ManageRoots, Act.ManageSeal, Act.ManageTimeStamp, Act.ManagePublicAddress,
    ];

    /// <summary>Acts that nobody does by themselves: they follow from another act.</summary>
    public static readonly IReadOnlyList<Act> Following = [Act.Supersede];

    public static Role[] Roles(Act act, bool own) => [.. Rows.Where(row => row.Act == act && (own ? row.Own : row.Other)).Select(row => row.Role)];

    /// <summary>The table as it stands in DEVELOPERS.md.</summary>
    public static string Printed()
    {
        var text = new StringBuilder("| act | role | own structures | other's, opened in this role | password again |\n|---|---|---|---|---|\n");
        foreach (var row in Rows)
            text.Append(CultureInfo.InvariantCulture, $"| {row.Act} | {row.Role} | {Word(row.Own)} | {Word(row.Other)} | {Again(row.Act)} |\n");
        foreach (var act in OfAdministrator) text.Append(CultureInfo.InvariantCulture, $"| {act} | administrator | whole installation | | {Again(act)} |\n");
        foreach (var act in OfOneself) text.Append(CultureInfo.InvariantCulture, $"| {act} | everybody | for themselves | | {Again(act)} |\n");
        return text.ToString();
    }

    private static string Again(Act act) => Word(PasswordAgain.Contains(act));

    private static string Word(bool may) => may ? "yes" : "no";

    private static IEnumerable<Right> Both(Act act, params Role[] roles) => roles.Select(role => new Right(act, role, Own: true, Other: true));

    private static IEnumerable<Right> OwnOnly(Act act, params Role[] roles) => roles.Select(role => new Right(act, role, Own: true, Other: false));
}
