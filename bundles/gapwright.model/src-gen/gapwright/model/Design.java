/**
 */
package gapwright.model;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A magnetic core with its gaps, magnets and windings, the materials it is made of and the operating points it must survive. Carries everything needed to recompute it.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Design#getName <em>Name</em>}</li>
 *   <li>{@link gapwright.model.Design#getNotes <em>Notes</em>}</li>
 *   <li>{@link gapwright.model.Design#getMaterials <em>Materials</em>}</li>
 *   <li>{@link gapwright.model.Design#getJoints <em>Joints</em>}</li>
 *   <li>{@link gapwright.model.Design#getLegs <em>Legs</em>}</li>
 *   <li>{@link gapwright.model.Design#getAirPaths <em>Air Paths</em>}</li>
 *   <li>{@link gapwright.model.Design#getWindings <em>Windings</em>}</li>
 *   <li>{@link gapwright.model.Design#getOperatingPoints <em>Operating Points</em>}</li>
 *   <li>{@link gapwright.model.Design#getLimits <em>Limits</em>}</li>
 *   <li>{@link gapwright.model.Design#getLeakages <em>Leakages</em>}</li>
 *   <li>{@link gapwright.model.Design#getConnections <em>Connections</em>}</li>
 *   <li>{@link gapwright.model.Design#getTolerances <em>Tolerances</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getDesign()
 * @model
 * @generated
 */
public interface Design extends EObject {
	/**
	 * Returns the value of the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What the designer calls it.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Name</em>' attribute.
	 * @see #setName(String)
	 * @see gapwright.model.GapwrightPackage#getDesign_Name()
	 * @model
	 * @generated
	 */
	String getName();

	/**
	 * Sets the value of the '{@link gapwright.model.Design#getName <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Name</em>' attribute.
	 * @see #getName()
	 * @generated
	 */
	void setName(String value);

	/**
	 * Returns the value of the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Free text.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Notes</em>' attribute.
	 * @see #setNotes(String)
	 * @see gapwright.model.GapwrightPackage#getDesign_Notes()
	 * @model
	 * @generated
	 */
	String getNotes();

	/**
	 * Sets the value of the '{@link gapwright.model.Design#getNotes <em>Notes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Notes</em>' attribute.
	 * @see #getNotes()
	 * @generated
	 */
	void setNotes(String value);

	/**
	 * Returns the value of the '<em><b>Materials</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.Material}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Materials of the legs; copied in, so that the file stands alone.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Materials</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getDesign_Materials()
	 * @model containment="true"
	 * @generated
	 */
	EList<Material> getMaterials();

	/**
	 * Returns the value of the '<em><b>Joints</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.Joint}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Points where legs meet.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Joints</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getDesign_Joints()
	 * @model containment="true"
	 * @generated
	 */
	EList<Joint> getJoints();

	/**
	 * Returns the value of the '<em><b>Legs</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.Leg}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Bars of iron between joints.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Legs</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getDesign_Legs()
	 * @model containment="true"
	 * @generated
	 */
	EList<Leg> getLegs();

	/**
	 * Returns the value of the '<em><b>Air Paths</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.AirPath}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Flux paths through air between joints.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Air Paths</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getDesign_AirPaths()
	 * @model containment="true"
	 * @generated
	 */
	EList<AirPath> getAirPaths();

	/**
	 * Returns the value of the '<em><b>Windings</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.Winding}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Windings, each a series connection of coils.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Windings</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getDesign_Windings()
	 * @model containment="true"
	 * @generated
	 */
	EList<Winding> getWindings();

	/**
	 * Returns the value of the '<em><b>Operating Points</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.OperatingPoint}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The conditions the design is judged at.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Operating Points</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getDesign_OperatingPoints()
	 * @model containment="true"
	 * @generated
	 */
	EList<OperatingPoint> getOperatingPoints();

	/**
	 * Returns the value of the '<em><b>Limits</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Where near begins; left out: the defaults.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Limits</em>' containment reference.
	 * @see #setLimits(Limits)
	 * @see gapwright.model.GapwrightPackage#getDesign_Limits()
	 * @model containment="true"
	 * @generated
	 */
	Limits getLimits();

	/**
	 * Sets the value of the '{@link gapwright.model.Design#getLimits <em>Limits</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Limits</em>' containment reference.
	 * @see #getLimits()
	 * @generated
	 */
	void setLimits(Limits value);

	/**
	 * Returns the value of the '<em><b>Leakages</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.WindingLeakage}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Pairs of windings whose leakage inductance is reckoned from their builds.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Leakages</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getDesign_Leakages()
	 * @model containment="true"
	 * @generated
	 */
	EList<WindingLeakage> getLeakages();

	/**
	 * Returns the value of the '<em><b>Connections</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.WindingConnection}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Series and parallel connections of windings whose inductance is reported.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Connections</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getDesign_Connections()
	 * @model containment="true"
	 * @generated
	 */
	EList<WindingConnection> getConnections();

	/**
	 * Returns the value of the '<em><b>Tolerances</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.Tolerance}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How far single values may be from what is drawn.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Tolerances</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getDesign_Tolerances()
	 * @model containment="true"
	 * @generated
	 */
	EList<Tolerance> getTolerances();

} // Design
